import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { Course } from '$lib/domain/courses/schema';
import type { SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import type { DataSheet } from '$lib/domain/data-sheets/schema';
import { sittings } from '$lib/server/data/models';
import { revisionsOfAttempt } from '$lib/server/data/queries/attempt-context';
import { newestRevision } from '$lib/server/data/queries/publications';
import { findSubmission } from '$lib/server/data/queries/submissions';
import { find } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { beginSheetDraft } from '$lib/server/services/courses/begin-sheet-draft';
import { publishSheet, reviewSheetDraft } from '$lib/server/services/courses/publish-sheet';
import { exportDataSheet, readDataSheet } from '$lib/server/services/courses/read-data-sheets';
import { readSheetDraft } from '$lib/server/services/courses/read-sheet-draft';
import { workOnSheetDraft } from '$lib/server/services/courses/work-on-sheet-draft';
import { beginSitting } from '$lib/server/services/quizzes/begin-sitting';
import { handInSitting } from '$lib/server/services/quizzes/end-sitting';
import { openOnDevice } from '$lib/server/services/quizzes/open-on-device';
import { satQuestions } from '$lib/server/services/quizzes/quiz-step';
import { readSittingResult } from '$lib/server/services/quizzes/read-quiz';
import { saveResponse } from '$lib/server/services/quizzes/save-response';
import { openSubmission } from '$lib/server/services/submissions/open-submission';
import { enrolIlka, schoolWithSheets, type School } from './school-with-sheets';

const key = 'av3-1150';
let school: School;
let enrolmentId: string;
let steps: Course['steps'];
beforeEach(async () => {
	school = await schoolWithSheets();
	enrolmentId = await enrolIlka(school);
	const course = await newestRevision(scope(), 'course', 'reading-failed-engines');
	({ steps } = course?.body as Course);
});
afterEach(() => school.house.close());

const scope = () => within(school.house.look, school.id);
const stepOf = (ref: string) => steps.find((one) => one.ref === ref)?.key ?? '';
const standing = async () => (await newestRevision(scope(), 'data-sheet', key))?.body as DataSheet;
const printedOrder = async () =>
	(await standing()).patterns.find((one) => one.key === 'head.bolts')?.printedOrder ?? [];

async function begin(): Promise<string> {
	const input = { enrolmentId, stepKey: stepOf('torque-and-tagging') };
	const { sittingId } = await beginSitting(await school.ilka.caller(), input);
	await openOnDevice(await school.ilka.caller(), { sittingId });
	return sittingId;
}

/** Gives this order to the question on the head bolts, hands in, and says what it earned. */
async function answerWith(sittingId: string, order: string[]) {
	const sitting = await find(scope(), sittings, { id: sittingId });
	if (!sitting) throw new Error('there is no such sitting');
	const sat = await satQuestions(scope(), sitting);
	const question = sat.find((one) => one.key === 'head-bolt-order');
	if (!question) throw new Error('the quiz always asks for the order of the head bolts');
	const place = { epoch: sitting.epoch, number: 1, questionId: question.id };
	await saveResponse(await school.ilka.caller(), { sittingId, ...place, response: { order } });
	await handInSitting(await school.ilka.caller(), { sittingId });
	const { questions } = await readSittingResult(await school.ilka.caller(), { sittingId });
	return questions.find((one) => one.id === question.id)?.score?.points;
}

/** Publishes the head bolts in another order, and the crankpin with another wear limit. */
async function publishOtherOrder(order: string) {
	const marit = () => school.marit.caller();
	await beginSheetDraft(await marit(), { key });
	const { draft } = await readSheetDraft(await marit(), { key });
	const body = draft?.body as SheetDraft;
	const row = (section: 'patterns' | 'dimensions', named: string) =>
		body.rows[section].find((one) => one.values.key === named)?.id ?? '';
	const { version } = await workOnSheetDraft(await marit(), {
		key,
		baseVersion: draft?.version,
		operations: [
			{
				kind: 'set',
				section: 'patterns',
				row: row('patterns', 'head.bolts'),
				field: 'printedOrder',
				value: order
			},
			{
				kind: 'set',
				section: 'dimensions',
				row: row('dimensions', 'crankpin.diameter'),
				field: 'wearLeast',
				value: '39.96'
			}
		]
	});
	const review = await reviewSheetDraft(await marit(), { key });
	const input = { key, schoolId: school.id, baseVersion: version, read: review.warnings };
	await publishSheet(await marit(), input);
	return review;
}

describe('what is under way when a sheet is published', () => {
	it('a sitting is scored by the sheet that it was drawn from, a new one by the new sheet', async () => {
		const old = await printedOrder();
		const sittingId = await begin();
		const other = [...old].reverse();
		const { sittings: listed } = await publishOtherOrder(other.join(' '));
		expect(listed).toEqual([
			expect.objectContaining({ id: sittingId, studentName: 'Ilka Brandt', letter: 'C' })
		]);
		expect(await printedOrder()).toEqual(other);
		expect(await answerWith(sittingId, old)).toBe(1);
		school.house.passMs(13 * 3600 * 1000);
		expect(await answerWith(await begin(), old)).toBeLessThan(1);
		school.house.passMs(13 * 3600 * 1000);
		expect(await answerWith(await begin(), other)).toBe(1);
	});

	it('an attempt at a job sheet keeps the limits that it was opened on', async () => {
		const opened = { enrolmentId, stepKey: stepOf('crankpins-and-shells') };
		const { submissionId } = await openSubmission(await school.ilka.caller(), opened);
		const { attempts } = await publishOtherOrder((await printedOrder()).toReversed().join(' '));
		expect(attempts).toEqual([
			expect.objectContaining({ id: submissionId, studentName: 'Ilka Brandt', letter: 'C' })
		]);
		const attempt = await findSubmission(scope(), submissionId);
		if (!attempt) throw new Error('it was opened');
		const { sheet } = await revisionsOfAttempt(scope(), attempt);
		const pin = (of: DataSheet) => of.dimensions.find((one) => one.key === 'crankpin.diameter');
		expect(sheet.revision).toBe('C');
		expect(pin(sheet)?.runAgain).toEqual({ least: 39.95 });
		expect(pin(await standing())?.runAgain).toEqual({ least: 39.96 });
	});

	it('a printed order is shown to nobody while they are asked for one', async () => {
		const orders = async (who = school.ilka) => {
			const { sheet, hideOrders } = await readDataSheet(await who.caller(), { key });
			const file = await exportDataSheet(await who.caller(), { key, as: 'json' });
			return { hideOrders, inSheet: JSON.stringify(sheet), inFile: file.text };
		};
		expect((await orders()).inSheet).toContain('printedOrder');
		await begin();
		const asked = await orders();
		expect(asked.hideOrders).toBe(true);
		expect(asked.inSheet + asked.inFile).not.toContain('printedOrder');
		const marit = await orders(school.marit);
		expect(marit.hideOrders).toBe(false);
		expect(marit.inFile).toContain('printedOrder');
	});
});
