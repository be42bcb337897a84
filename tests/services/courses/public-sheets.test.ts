import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { beginSheetDraft } from '$lib/server/services/courses/begin-sheet-draft';
import { publishSheet, reviewSheetDraft } from '$lib/server/services/courses/publish-sheet';
import {
	exportPublicSheet,
	listPublicSheets,
	readPublicSheet
} from '$lib/server/services/courses/read-public-sheets';
import { readSheetDraft } from '$lib/server/services/courses/read-sheet-draft';
import { workOnSheetDraft } from '$lib/server/services/courses/work-on-sheet-draft';
import { callerAs } from '../../support/house';
import { schoolWithSheets, type School } from './school-with-sheets';

let school: School;
beforeEach(async () => {
	school = await schoolWithSheets();
});
afterEach(() => school.house.close());

const stranger = () => ({ ...callerAs(school.house), schoolId: school.id });
const listed = async () =>
	(await listPublicSheets(callerAs(school.house), {})).sheets.map((one) => one.href);

/** Ticks or unticks "Public" in a draft, and publishes it. */
async function publishAs(key: string, value: 'yes' | '') {
	const marit = () => school.marit.caller();
	await beginSheetDraft(await marit(), { key });
	const { draft } = await readSheetDraft(await marit(), { key });
	const { version } = await workOnSheetDraft(await marit(), {
		key,
		baseVersion: draft?.version,
		operations: [{ kind: 'set', section: 'head', row: 'head', field: 'public', value }]
	});
	const { warnings } = await reviewSheetDraft(await marit(), { key });
	const input = { key, schoolId: school.id, baseVersion: version, read: warnings };
	return publishSheet(await marit(), input);
}

describe('a public data sheet', () => {
	it('is read by anybody while its newest revision is public, and by nobody after', async () => {
		const key = 'av3-1150';
		const href = `/data-sheets/averholm/${key}`;
		if (!(await listed()).includes(href)) await publishAs(key, 'yes');
		expect(await listed()).toContain(href);
		const { sheet } = await readPublicSheet(stranger(), { key });
		const { text, hash } = await exportPublicSheet(stranger(), { key, as: 'json' });
		expect(dataSheetSchema.parse(JSON.parse(text))).toEqual(sheet);

		await publishAs(key, '');
		expect(await listed()).not.toContain(href);
		for (const gone of [
			readPublicSheet(stranger(), { key }),
			exportPublicSheet(stranger(), { key, as: 'csv' })
		])
			await expect(gone).rejects.toMatchObject({
				code: expect.stringMatching(/absent|signed-out/)
			});

		await publishAs(key, 'yes');
		expect((await exportPublicSheet(stranger(), { key, as: 'json' })).hash).not.toBe(hash);
	});

	it('of another school stays that school’s', async () => {
		const other = await school.house.addSchool('korrig');
		const asked = readPublicSheet(
			{ ...callerAs(school.house), schoolId: other },
			{ key: 'av3-1150' }
		);
		await expect(asked).rejects.toMatchObject({ code: 'absent' });
	});
});
