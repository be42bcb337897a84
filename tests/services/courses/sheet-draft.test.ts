import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import type { SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import type { DraftOperation } from '$lib/domain/data-sheets/draft/operation';
import { drafts } from '$lib/server/data/models';
import { readLedger } from '$lib/server/data/queries/ledger';
import { select } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import {
	beginNewSheet,
	beginSheetDraft,
	beginSheetFromFile
} from '$lib/server/services/courses/begin-sheet-draft';
import { listDataSheets } from '$lib/server/services/courses/read-data-sheets';
import { readSheetDraft } from '$lib/server/services/courses/read-sheet-draft';
import {
	discardSheetDraft,
	readFileIntoDraft,
	workOnSheetDraft
} from '$lib/server/services/courses/work-on-sheet-draft';
import type { TestPerson } from '../../support/house';
import { schoolWithSheets, type School } from './school-with-sheets';

const key = 'av3-1150';
const ulid = (n: number) => `01JQ000000000000000000${String(n).padStart(4, '0')}`;
const title = (value: string): DraftOperation => ({
	kind: 'set',
	section: 'head',
	row: 'head',
	field: 'title',
	value
});

let school: School;
beforeEach(async () => {
	school = await schoolWithSheets();
});
afterEach(() => school.house.close());

const begin = async (who = school.marit) => beginSheetDraft(await who.caller(), { key });
const type = async (
	baseVersion: number,
	operations: DraftOperation[],
	who = school.marit,
	requestKey?: string
) => workOnSheetDraft(await who.caller(requestKey), { key, baseVersion, operations });
async function draftNow(): Promise<{ version: number; body: SheetDraft }> {
	const { draft } = await readSheetDraft(await school.marit.caller(), { key });
	if (!draft) throw new Error('there is no draft');
	return draft;
}

describe('a draft of a data sheet', () => {
	it('is begun once from the published revision, and keeps what cannot be published', async () => {
		await begin();
		await begin(school.otto);
		expect(await select(school.house.look, drafts)).toHaveLength(1);
		const { body } = await draftNow();
		const row = body.rows.dimensions.find((one) => one.values.key === 'crankpin.oilClearance');
		const nonsense: DraftOperation = {
			kind: 'set',
			section: 'dimensions',
			row: row?.id ?? '',
			field: 'wearMost',
			value: 'seven hundredths?'
		};
		expect(await type(1, [nonsense, title('')])).toEqual({ version: 2 });
		const now = await draftNow();
		expect(now.body.head.title).toBe('');
		expect(
			now.body.rows.dimensions.find((one) => one.values.key === 'crankpin.oilClearance')?.values
				.wearMost
		).toBe('seven hundredths?');
	});

	it('changed by two at once shows both sides and overwrites nothing', async () => {
		await begin();
		await type(1, [title('of Marit')]);
		const late = type(1, [title('of Otto')], school.otto);
		await expect(late).rejects.toMatchObject({
			code: 'stale',
			parameters: { name: 'Marit Oyelaran' },
			detail: { version: 2, by: 'Marit Oyelaran', body: { head: { title: 'of Marit' } } }
		});
		expect((await draftNow()).body.head.title).toBe('of Marit');
		expect(await type(2, [title('of Otto')], school.otto)).toEqual({ version: 3 });
	});

	it('takes a batch once, however often it is sent', async () => {
		await begin();
		const sent = () => type(1, [title('sent twice')], school.marit, ulid(1));
		expect(await Promise.all([sent(), sent()])).toEqual([{ version: 2 }, { version: 2 }]);
		expect((await draftNow()).version).toBe(2);
	});

	it('is refused when it grows past what a sheet can hold', async () => {
		await begin();
		const rows = (from: number): DraftOperation[] =>
			Array.from({ length: 200 }, (_, i) => ({
				kind: 'add',
				section: 'fluids',
				row: `row${from + i}`,
				values: {}
			}));
		await type(1, rows(0));
		await type(2, rows(200));
		await expect(type(3, rows(400))).rejects.toMatchObject({ code: 'input' });
		expect((await draftNow()).version).toBe(3);
	});

	it('is discarded only as it was seen, and that stands in the ledger', async () => {
		await begin();
		await type(1, [title('another')]);
		const discard = async (baseVersion: number) =>
			discardSheetDraft(await school.otto.caller(), { key, baseVersion });
		await expect(discard(1)).rejects.toMatchObject({ code: 'stale' });
		expect(await discard(2)).toEqual({ isPublished: true });
		expect(await select(school.house.look, drafts)).toEqual([]);
		const ledger = await readLedger(within(school.house.look, school.id));
		expect(ledger.at(-1)).toMatchObject({ kind: 'data-sheet-draft-discarded', subject: key });
	});
});

describe('who may write a draft', () => {
	const asks: [string, (who: TestPerson) => Promise<unknown>][] = [
		['begin', async (who) => beginSheetDraft(await who.caller(), { key })],
		['read', async (who) => readSheetDraft(await who.caller(), { key })],
		[
			'type',
			async (who) =>
				workOnSheetDraft(await who.caller(), { key, baseVersion: 1, operations: [title('x')] })
		],
		['discard', async (who) => discardSheetDraft(await who.caller(), { key, baseVersion: 1 })]
	];

	it.each(asks)('to %s: nobody but an instructor of the school', async (_, ask) => {
		await begin();
		const elsewhere = await school.house.addSchool('korrig');
		const other = await school.house.addPerson(elsewhere, 'Aoife Lunn', ['instructor']);
		for (const who of [school.ilka, school.admin, school.verifier, other])
			await expect(ask(who)).rejects.toMatchObject({ code: 'absent' });
	});

	it('begins no new sheet for anybody else', async () => {
		for (const who of [school.ilka, school.admin, school.verifier]) {
			const begun = beginNewSheet(await who.caller(), { code: 'KT-900', title: 'x' });
			await expect(begun).rejects.toMatchObject({ code: 'absent' });
		}
	});

	it('lists drafts only for those who may write them, and never those of another school', async () => {
		await begin();
		await beginNewSheet(await school.marit.caller(), { code: 'kt 900', title: 'one of ours' });
		const elsewhere = await school.house.addSchool('korrig');
		const other = await school.house.addPerson(elsewhere, 'Aoife Lunn', ['instructor']);
		const seen = async (who: TestPerson) => {
			const { sheets, begun } = await listDataSheets(await who.caller(), {});
			return { drafts: sheets.filter((one) => one.draft).map((one) => one.key), begun };
		};
		expect(await seen(school.otto)).toMatchObject({
			drafts: [key],
			begun: [{ key: 'kt-900', code: 'KT-900', title: 'one of ours' }]
		});
		expect(await seen(school.ilka)).toEqual({ drafts: [], begun: [] });
		expect(await seen(other)).toEqual({ drafts: [], begun: [] });
	});
});

describe('a new sheet', () => {
	const code = async (typed: string) =>
		beginNewSheet(await school.marit.caller(), { code: typed, title: 'of our own' });

	it.each(['AV3-1150', 'av4-2200d', ' kt-900 '])('cannot take the code %j twice', async (typed) => {
		await code('KT-900');
		await expect(code(typed)).rejects.toMatchObject({
			code: 'input',
			fields: { code: [expect.any(String)] }
		});
	});

	it('says what a code is', async () => {
		await expect(code('KT/900')).rejects.toMatchObject({
			fields: { code: ['Capitals, digits and hyphens.'] }
		});
	});

	it('is read from a file, faults and all', async () => {
		const text = 'code: KT-900\ncolour: grey\ndimensions:\n  - {key: head.gap, nominal: about 2}\n';
		const { key: made, leftOut } = await beginSheetFromFile(await school.marit.caller(), { text });
		expect(leftOut).toEqual(['colour']);
		const { draft } = await readSheetDraft(await school.marit.caller(), { key: made });
		expect(draft?.body.rows.dimensions).toEqual([
			{ id: '1', values: { key: 'head.gap', nominal: 'about 2' } }
		]);
	});

	it.each([
		['a: [', /cannot be read as YAML/],
		['just words', /no data sheet/],
		['dimensions: []', /no code/],
		[`code: AV3-1150\ndimensions: []`, /comes with a course/]
	])('is not begun from %j', async (text, says) => {
		const begun = beginSheetFromFile(await school.marit.caller(), { text });
		await expect(begun).rejects.toMatchObject({ fields: { text: [expect.stringMatching(says)] } });
	});

	it('takes the place of a draft when its file is read into it', async () => {
		await begin();
		const text = JSON.stringify(catalogue().engines.find((one) => one.key === 'av4-2200d'));
		const read = async (baseVersion: number) =>
			readFileIntoDraft(await school.marit.caller(), { key, baseVersion, text });
		await expect(read(7)).rejects.toMatchObject({ code: 'stale' });
		expect(await read(1)).toMatchObject({ version: 2, leftOut: [] });
		expect((await draftNow()).body.head.code).toBe('AV4-2200D');
	});
});
