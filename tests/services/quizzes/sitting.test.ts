import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { graceSeconds } from '$lib/domain/quizzes/deadline';
import { kindOf } from '$lib/domain/questions/registry';
import { cohorts, orders, places, responses, sittings, stepStates } from '$lib/server/data/models';
import { enrol } from '$lib/server/data/queries/enrolments';
import { newestRevision } from '$lib/server/data/queries/publications';
import { factsOf } from '$lib/server/data/queries/sittings';
import { insert, select } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { takeCourse } from '$lib/server/services/courses/take-course';
import { beginSitting } from '$lib/server/services/quizzes/begin-sitting';
import { endOverdueSittings, handInSitting } from '$lib/server/services/quizzes/end-sitting';
import { openOnDevice } from '$lib/server/services/quizzes/open-on-device';
import { satQuestions } from '$lib/server/services/quizzes/quiz-step';
import { readSittingResult } from '$lib/server/services/quizzes/read-quiz';
import { saveResponse } from '$lib/server/services/quizzes/save-response';
import { asSystem, makeHouse, type TestHouse, type TestPerson } from '../../support/house';

const minuteMs = 60_000;
const key = (n: number) => `01JQ000000000000000000${String(n).padStart(4, '0')}`;

let house: TestHouse;
let school: string;
let ilka: TestPerson;
let enrolmentId: string;
let stepKey: string;

beforeEach(async () => {
	house = await makeHouse({ catalogue: catalogue() });
	school = await house.addSchool('averholm');
	const admin = await house.addPerson(school, 'Ragna Holt', ['admin']);
	const marit = await house.addPerson(school, 'Marit Oyelaran', ['instructor']);
	ilka = await house.addPerson(school, 'Ilka Brandt', ['student']);
	// Both courses: the drawer then holds questions on another engine, which no sitting may draw.
	for (const courseKey of ['crankpins-of-a-diesel', 'reading-failed-engines'])
		await takeCourse(await admin.caller(), { courseKey, schoolId: school });
	enrolmentId = 'enrolment';
	stepKey = '';
	await house.lay(async (common) => {
		const scope = within(common, school);
		const course = await newestRevision(scope, 'course', 'reading-failed-engines');
		if (!course) throw new Error('the course is not published');
		const { steps } = course.body as { steps: { key: string; kind: string; ref: string }[] };
		stepKey = steps.find((one) => one.ref === 'torque-and-tagging')?.key ?? '';
		const at = house.now().toISOString();
		const money = { priceMinor: 0, currency: 'EUR' };
		await insert(scope, cohorts, {
			id: 'cohort',
			courseId: course.publicationId,
			courseRevisionId: course.id,
			title: 'Spring',
			startsOn: '2026-03-01',
			endsOn: '2026-06-01',
			instructorId: marit.personId,
			createdAt: at,
			...money
		});
		await insert(scope, orders, {
			id: 'order',
			cohortId: 'cohort',
			quantity: 1,
			amountMinor: 0,
			currency: 'EUR',
			method: 'bank-transfer',
			state: 'paid',
			reference: 'r',
			checkoutId: null,
			checkoutUrl: null,
			paymentId: null,
			fault: null,
			createdBy: admin.personId,
			createdAt: at,
			settledAt: at
		});
		const place = { id: 'place', cohortId: 'cohort', orderId: 'order', number: 1, openedAt: at };
		await insert(scope, places, place);
		await enrol(scope, {
			id: enrolmentId,
			cohortId: 'cohort',
			courseRevisionId: course.id,
			personId: ilka.personId,
			placeId: 'place',
			rosterEntryId: null,
			enrolledAt: at
		});
	});
});
afterEach(() => house.close());

const begin = async () =>
	(await beginSitting(await ilka.caller(), { enrolmentId, stepKey })).sittingId;
const open = async (sittingId: string) => openOnDevice(await ilka.caller(), { sittingId });
const give = async (
	sittingId: string,
	questionId: string,
	{ epoch, number }: { epoch: number; number: number },
	response: unknown,
	requestKey?: string
) =>
	saveResponse(await ilka.caller(requestKey), { sittingId, questionId, epoch, number, response });
const rows = () => select(house.look, responses);

/** Each question with the response that its own key describes; the number kinds are left out. */
async function rightResponses(sittingId: string) {
	const scope = within(house.look, school);
	const [sitting] = await select(house.look, sittings, { id: sittingId });
	if (!sitting) throw new Error('there is no such sitting');
	return (await satQuestions(scope, sitting)).map(({ id, seed, question, figures }) => {
		const kind = kindOf(question.kind);
		const drawn = kind.draw(question.body, seed, figures);
		if (!drawn.ok) throw new Error(drawn.because);
		const { words, optionIds = [], order = [] } = kind.answer(question.body, drawn.value);
		const [, value = '', unit = ''] = /^([\d.]+)\s*(.*)$/.exec(words) ?? [];
		const response = {
			'single-choice': { choice: optionIds[0] },
			'several-choices': { choices: optionIds },
			ruling: { ruling: optionIds[0] },
			'tightening-order': { order },
			'number-with-unit': { value, unit }
		}[question.kind];
		return { id, response };
	});
}

describe('a sitting', () => {
	it('is begun once, however often the button is pressed', async () => {
		const [first, second] = await Promise.all([begin(), begin()]);
		expect(second).toBe(first);
		expect((await select(house.look, sittings)).length).toBe(1);
	});

	it('draws only what its own course teaches, on its own engine', async () => {
		await begin();
		const [sitting] = await select(house.look, sittings);
		if (!sitting) throw new Error('there is no sitting');
		const sat = await satQuestions(within(house.look, school), sitting);
		expect(sat.length).toBe(12);
		for (const { question } of sat) expect(question.sheet ?? 'av3-1150').toBe('av3-1150');
	});

	it('sends faces without seed or key', async () => {
		const sittingId = await begin();
		const { questions } = await open(sittingId);
		const sent = JSON.stringify(questions);
		expect(sent).not.toMatch(/"(seed|right|expected|printedOrder|because|working|answer)"\s*:/);
		const [sitting] = await select(house.look, sittings, { id: sittingId });
		if (!sitting) throw new Error('there is no sitting');
		for (const { seed } of await satQuestions(within(house.look, school), sitting))
			expect(sent).not.toContain(seed);
	});

	it('is nobody else’s, and nothing shows its result before it has ended', async () => {
		const sittingId = await begin();
		const other = await house.addPerson(school, 'Tove Anker', ['student', 'admin', 'instructor']);
		await expect(openOnDevice(await other.caller(), { sittingId })).rejects.toMatchObject({
			code: 'absent'
		});
		await expect(readSittingResult(await ilka.caller(), { sittingId })).rejects.toMatchObject({
			code: 'absent'
		});
	});
});

describe('responses', () => {
	it('repeated, reordered or from a device that was left never undo a newer one', async () => {
		const sittingId = await begin();
		const { epoch, questions } = await open(sittingId);
		const [choice] = questions.filter((one) => one.kind === 'single-choice');
		const id = choice?.id ?? '';
		await give(sittingId, id, { epoch, number: 2 }, { choice: 'b' });
		expect(await give(sittingId, id, { epoch, number: 1 }, { choice: 'a' })).toMatchObject({
			verdict: 'older'
		});
		expect(await give(sittingId, id, { epoch, number: 2 }, { choice: 'b' })).toMatchObject({
			verdict: 'same'
		});
		expect(await rows()).toMatchObject([{ body: { choice: 'b' }, epoch, number: 2 }]);

		const second = await open(sittingId);
		expect(second.epoch).toBe(epoch + 1);
		expect(second.questions.find((one) => one.id === id)).toMatchObject({
			response: { choice: 'b' },
			given: { epoch, number: 2 }
		});
		expect(await give(sittingId, id, { epoch, number: 9 }, { choice: 'c' })).toMatchObject({
			verdict: 'other-epoch'
		});
		expect(await rows()).toMatchObject([{ body: { choice: 'b' } }]);
		const facts = await factsOf(within(house.look, school), sittingId);
		expect(facts.map((one) => one.kind)).toEqual(['opened', 'opened', 'save-from-earlier-device']);
	});

	it('sent again under their key give the same answer; the key with another body is refused', async () => {
		const sittingId = await begin();
		const { epoch, questions } = await open(sittingId);
		const id = questions.find((one) => one.kind === 'ruling')?.id ?? '';
		const place = { epoch, number: 1 };
		const first = await give(sittingId, id, place, { ruling: 'out' }, key(1));
		house.passMs(5000);
		expect(await give(sittingId, id, place, { ruling: 'out' }, key(1))).toEqual(first);
		await expect(give(sittingId, id, place, { ruling: 'within' }, key(1))).rejects.toMatchObject({
			code: 'conflict'
		});
		expect(await rows()).toMatchObject([{ body: { ruling: 'out' } }]);
	});

	it('must have the form of their question', async () => {
		const sittingId = await begin();
		const { epoch, questions } = await open(sittingId);
		const id = questions.find((one) => one.kind === 'ruling')?.id ?? '';
		for (const response of [null, { ruling: 'maybe' }, { ruling: 'out', points: 1 }, 'out'])
			await expect(give(sittingId, id, { epoch, number: 1 }, response)).rejects.toMatchObject({
				code: 'input'
			});
		expect(await rows()).toEqual([]);
	});

	it('count within the grace of the server’s deadline, and not after it', async () => {
		const sittingId = await begin();
		const { epoch, deadlineAt, questions } = await open(sittingId);
		expect(Date.parse(deadlineAt ?? '')).toBe(house.now().getTime() + 40 * minuteMs);
		const id = questions.find((one) => one.kind === 'ruling')?.id ?? '';
		house.passMs(40 * minuteMs + graceSeconds * 1000);
		await give(sittingId, id, { epoch, number: 1 }, { ruling: 'out' });
		house.passMs(1);
		await expect(
			give(sittingId, id, { epoch, number: 2 }, { ruling: 'within' })
		).rejects.toMatchObject({ code: 'closed' });
		expect(await rows()).toMatchObject([{ body: { ruling: 'out' } }]);
		await endOverdueSittings(asSystem(house), {});
		expect(await select(house.look, sittings)).toMatchObject([
			{ state: 'ended', endedBecause: 'time-over', possible: 12, passed: 0 }
		]);
	});
});

describe('after handing in', () => {
	it('all right is all points, and every question shows its working, source and lesson', async () => {
		const sittingId = await begin();
		const { epoch } = await open(sittingId);
		let number = 0;
		for (const { id, response } of await rightResponses(sittingId))
			await give(sittingId, id, { epoch, number: ++number }, response);
		await handInSitting(await ilka.caller(), { sittingId });
		expect(await select(house.look, sittings)).toMatchObject([
			{ state: 'ended', endedBecause: 'handed-in', points: 12, possible: 12, passed: 1 }
		]);
		expect(await select(house.look, stepStates, { stepKey })).toMatchObject([
			{ state: 'competent', score: 1 }
		]);
		const result = await readSittingResult(await ilka.caller(), { sittingId });
		expect(result).toMatchObject({ passed: true });
		for (const one of result.questions) {
			expect(one.score).toMatchObject({ right: true, points: 1 });
			expect(one.working.length).toBeGreaterThan(0);
			expect(one.source).not.toBe('');
			expect(one.readAgain.step).not.toBeNull();
		}
		await expect(begin()).rejects.toMatchObject({ code: 'conflict' });
	});

	it('what was cleared again counts as left out; nothing can be changed; the next waits', async () => {
		const sittingId = await begin();
		const { epoch, questions } = await open(sittingId);
		const id = questions.find((one) => one.kind === 'single-choice')?.id ?? '';
		await give(sittingId, id, { epoch, number: 1 }, { choice: 'a' });
		await give(sittingId, id, { epoch, number: 2 }, { choice: null });
		await handInSitting(await ilka.caller(), { sittingId });
		const { questions: shown, words } = await readSittingResult(await ilka.caller(), {
			sittingId
		});
		expect(shown.find((one) => one.id === id)).toMatchObject({ score: null, said: null });
		expect(words).toBe('Not passed: 0 of 12 points, 0 %. The cut score is 70 %.');
		await expect(give(sittingId, id, { epoch, number: 3 }, { choice: 'a' })).rejects.toMatchObject({
			code: 'closed'
		});
		await expect(begin()).rejects.toMatchObject({ code: 'conflict' });
		house.passMs(12 * 60 * minuteMs);
		expect(await begin()).not.toBe(sittingId);
	});
});
