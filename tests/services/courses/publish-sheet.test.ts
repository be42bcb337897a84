import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import type { DraftOperation } from '$lib/domain/data-sheets/draft/operation';
import type { RowSection } from '$lib/domain/data-sheets/draft/sections';
import type { DataSheet } from '$lib/domain/data-sheets/schema';
import { dimensionOf } from '$lib/domain/data-sheets/value-of';
import { drafts } from '$lib/server/data/models';
import { readLedger } from '$lib/server/data/queries/ledger';
import { newestRevision, revisionsOf } from '$lib/server/data/queries/publications';
import { select } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { beginSheetDraft } from '$lib/server/services/courses/begin-sheet-draft';
import { publishSheet, reviewSheetDraft } from '$lib/server/services/courses/publish-sheet';
import { readSheetDraft } from '$lib/server/services/courses/read-sheet-draft';
import { readSheetHistory, readSheetRevision } from '$lib/server/services/courses/sheet-history';
import { workOnSheetDraft } from '$lib/server/services/courses/work-on-sheet-draft';
import { schoolWithSheets, type School } from './school-with-sheets';

const key = 'av3-1150';
let school: School;
let body: SheetDraft;
let version: number;
beforeEach(async () => {
	// Both courses: what is taught from the other engine must not be touched.
	school = await schoolWithSheets(['crankpins-of-a-diesel', 'reading-failed-engines']);
	await beginSheetDraft(await school.marit.caller(), { key });
	const { draft } = await readSheetDraft(await school.marit.caller(), { key });
	if (!draft) throw new Error('no draft was begun');
	({ body, version } = draft);
});
afterEach(() => school.house.close());

function rowOf(section: RowSection, sheetKey: string): string {
	const row = body.rows[section].find((one) => one.values.key === sheetKey);
	if (!row) throw new Error(`no ${sheetKey}`);
	return row.id;
}
async function type(...operations: DraftOperation[]) {
	const input = { key, baseVersion: version, operations };
	({ version } = await workOnSheetDraft(await school.marit.caller(), input));
}
const set = (
	section: RowSection,
	sheetKey: string,
	field: string,
	value: string
): DraftOperation => ({ kind: 'set', section, row: rowOf(section, sheetKey), field, value });
const takeOut = (section: RowSection, sheetKey: string): DraftOperation => ({
	kind: 'remove',
	section,
	row: rowOf(section, sheetKey)
});
const review = async () => reviewSheetDraft(await school.marit.caller(), { key });
const publish = async (more: Record<string, unknown> = {}) => {
	const { warnings } = await review();
	const input = { key, schoolId: school.id, baseVersion: version, read: warnings, ...more };
	return publishSheet(await school.marit.caller(), input);
};
const scope = () => within(school.house.look, school.id);
const standing = async () => (await newestRevision(scope(), 'data-sheet', key))?.body as DataSheet;

describe('publishing a data sheet', () => {
	it('makes the next revision, dated in the school, and the lessons that it touches anew', async () => {
		const before = await newestRevision(scope(), 'lesson', 'crankpins-and-clearances');
		await type(set('dimensions', 'crankpin.oilClearance', 'wearMost', '0,065'));
		const { revision, lessons } = await publish();
		expect(revision).toBe('D');
		expect(lessons).toBeGreaterThan(0);
		const sheet = await standing();
		expect(sheet).toMatchObject({ revision: 'D', issuedOn: '2026-03-02' });
		expect(dimensionOf(sheet, 'crankpin.oilClearance')?.runAgain).toEqual({ most: 0.065 });
		const after = await newestRevision(scope(), 'lesson', before?.key ?? '');
		expect(after?.number).toBe((before?.number ?? 0) + 1);
		expect((before?.body as { html: string }).html).not.toContain('0.065');
		expect((after?.body as { html: string }).html).toContain('0.065');
		expect(await select(school.house.look, drafts)).toEqual([]);
		const ledger = await readLedger(scope());
		expect(ledger.at(-1)).toMatchObject({
			kind: 'data-sheet-published',
			subject: key,
			data: { revision: 'D' }
		});
	});

	it('shows before it what the changes touch, and nothing else', async () => {
		await type(set('dimensions', 'crankpin.oilClearance', 'wearMost', '0.065'));
		const { changes, touched, refused, faults } = await review();
		expect({ refused, faults }).toEqual({ refused: [], faults: [] });
		const change = {
			key: 'crankpin.oilClearance',
			words: 'Crankpin, oil clearance',
			was: 'to run again up to 0.070 mm',
			now: 'to run again up to 0.065 mm'
		};
		expect(changes).toEqual([change]);
		expect(new Set(touched.map((one) => one.kind))).toEqual(
			new Set(['lesson', 'question', 'job-sheet'])
		);
		for (const one of touched) {
			expect(one.sheetKeys).toContain('crankpin.oilClearance');
			expect(one.changes).toEqual([change]);
		}
		expect(touched.map((one) => one.key)).toContain('crankpins-and-shells');
		expect(touched.map((one) => one.key)).not.toContain('one-crankpin');
	});

	it.each<[string, () => DraftOperation, RegExp]>([
		[
			'a limit crosses another',
			() => set('dimensions', 'crankpin.oilClearance', 'wearMost', '0.03'),
			/already be past its wear limit/
		],
		[
			'a key that is taught from vanishes',
			() => takeOut('dimensions', 'crankpin.taper'),
			/^crankpin\.taper is not .* is used by .*the job sheet Crankpins and shells/
		],
		[
			'a fastener of a pattern is drawn past its proof load',
			() => set('fasteners', 'mainJournal.capBolt', 'stages', '25 Nm + 250 Nm'),
			/past its proof load/
		]
	])('is refused while %s', async (_, operation, because) => {
		await type(operation());
		const { refused } = await review();
		expect(refused).toContainEqual(expect.stringMatching(because));
		await expect(publish()).rejects.toMatchObject({ code: 'input', fields: { refused } });
		expect((await standing()).revision).toBe('C');
	});

	it('is refused while something cannot be read, and says where', async () => {
		await type(set('dimensions', 'crankpin.oilClearance', 'least', '0.06'));
		const { faults, isReadable } = await review();
		expect(isReadable).toBe(false);
		expect(faults).toEqual([
			expect.objectContaining({
				section: 'dimensions',
				words: expect.stringMatching(/least limit/)
			})
		]);
		await expect(publish()).rejects.toMatchObject({ code: 'input' });
	});

	it('is refused where a question would lose its answer though its key is still there', async () => {
		const row = rowOf('dimensions', 'crankpin.oilClearance');
		const clear = ['least', 'most', 'wearMost'].map((field): DraftOperation => ({
			kind: 'set',
			section: 'dimensions',
			row,
			field,
			value: ''
		}));
		await type(...clear, set('dimensions', 'crankpin.oilClearance', 'nominal', '0.03'));
		const { refused } = await review();
		expect(refused).toContainEqual(expect.stringMatching(/^The question .* no answer any more/));
		expect(refused).toContainEqual(expect.stringMatching(/^For the job sheet .* no limits/));
	});

	it('is refused until every warning is ticked, and where nothing differs', async () => {
		await expect(publish()).rejects.toMatchObject({
			fields: { refused: ['Nothing in this draft differs from revision C.'] }
		});
		// A manual without a page in it may be right, and is read before it is published.
		await type(
			set('dimensions', 'crankpin.oilClearance', 'source', 'Workshop manual'),
			set('dimensions', 'crankpin.taper', 'source', 'Workshop manual')
		);
		await expect(publish({ read: [] })).rejects.toMatchObject({
			fields: { read: [expect.any(String)] }
		});
		const { warnings } = await review();
		expect(warnings).toHaveLength(2);
		await expect(publish({ read: warnings.slice(1) })).rejects.toMatchObject({ code: 'input' });
		await expect(publish()).resolves.toMatchObject({ revision: 'D' });
	});

	it('publishes what was looked at and not what somebody typed since', async () => {
		await type(set('dimensions', 'crankpin.oilClearance', 'wearMost', '0.065'));
		await workOnSheetDraft(await school.otto.caller(), {
			key,
			baseVersion: version,
			operations: [set('dimensions', 'crankpin.oilClearance', 'wearMost', '0.09')]
		});
		await expect(publish()).rejects.toMatchObject({ code: 'stale' });
		expect((await standing()).revision).toBe('C');
	});

	it('is done once by two who press at the same time', async () => {
		await type(set('dimensions', 'crankpin.oilClearance', 'wearMost', '0.065'));
		const done = await Promise.allSettled([publish(), publish()]);
		expect(done.map((one) => one.status).toSorted()).toEqual(['fulfilled', 'rejected']);
		expect(await revisionsOf(scope(), 'data-sheet', key)).toHaveLength(2);
	});

	it('is for instructors of the school alone', async () => {
		await type(set('dimensions', 'crankpin.oilClearance', 'wearMost', '0.065'));
		const elsewhere = await school.house.addSchool('korrig');
		const other = await school.house.addPerson(elsewhere, 'Aoife Lunn', ['instructor']);
		for (const who of [school.ilka, school.admin, school.verifier, other]) {
			const input = { key, schoolId: school.id, baseVersion: version, read: [] };
			await expect(publishSheet(await who.caller(), input)).rejects.toMatchObject({
				code: 'absent'
			});
			await expect(reviewSheetDraft(await who.caller(), { key })).rejects.toMatchObject({
				code: 'absent'
			});
		}
	});
});

describe('the history of a sheet', () => {
	it('says what changed at each revision, and shows an older one', async () => {
		await type(set('dimensions', 'crankpin.oilClearance', 'wearMost', '0.065'));
		await publish();
		const { revisions } = await readSheetHistory(await school.admin.caller(), { key });
		expect(revisions.map((one) => one.revision)).toEqual(['D', 'C']);
		expect(revisions.map((one) => one.changes?.map((change) => change.key))).toEqual([
			['crankpin.oilClearance'],
			undefined
		]);
		const { sheet, newest } = await readSheetRevision(await school.verifier.caller(), {
			key,
			revision: 'c'
		});
		expect(dimensionOf(sheet, 'crankpin.oilClearance')?.runAgain).toEqual({ most: 0.07 });
		expect(newest).toBe('D');
		const asStudent = readSheetHistory(await school.ilka.caller(), { key });
		await expect(asStudent).rejects.toMatchObject({ code: 'absent' });
	});
});
