import { afterEach, beforeEach, expect, it } from 'vitest';
import { awards, certificates, mails } from '$lib/server/data/models';
import { find, select } from '$lib/server/data/rows';
import { decideAward } from '$lib/server/services/awards/decide-award';
import { listAwards, readAward } from '$lib/server/services/awards/read-awards';
import { almostFinished, type Course } from './finished-course';

let course: Course;
beforeEach(async () => {
	course = await almostFinished();
});
afterEach(() => course.house.close());

const waiting = () => select(course.house.look, awards);
const lettersOf = async (kind: string) =>
	(await select(course.house.look, mails, { kind })).map((one) => one.recipient);
async function proposed(): Promise<string> {
	await course.enterHours(3);
	const [award] = await waiting();
	if (!award) throw new Error('no award was proposed');
	return award.id;
}

it('is proposed when the rule is met, not before, and only once', async () => {
	await course.enterHours(2);
	expect(await waiting()).toEqual([]);
	await course.enterHours(1);
	await course.enterHours(1);
	const [award, ...more] = await waiting();
	expect(more).toEqual([]);
	expect(award).toMatchObject({ state: 'waiting', rule: 'evidence-complete@1' });
	expect(award?.because.join(' ')).toContain('3 h at the bench recorded');
});

it('is made known to those who may decide it, not to who marked the work', async () => {
	await proposed();
	expect(await lettersOf('award-waiting')).toEqual([course.verifier.email]);
});

it('cannot be decided by who marked the work, also as a verifier', async () => {
	const awardId = await proposed();
	const marker = await course.marker.caller();
	expect((await listAwards(marker, {})).awards).toHaveLength(1);
	expect(await readAward(marker, { awardId })).toMatchObject({ mayDecide: false, isOwn: false });
	for (const decision of ['award', 'decline'])
		await expect(
			decideAward(marker, { awardId, decision, reason: 'Because.' })
		).rejects.toMatchObject({ code: 'absent' });
	expect((await waiting())[0]?.state).toBe('waiting');
});

it('cannot be decided by the office, the student, or a verifier of another school', async () => {
	const awardId = await proposed();
	const elsewhere = await course.house.addSchool('korrig');
	const stranger = await course.house.addPerson(elsewhere, 'Odd Vik', ['verifier']);
	for (const one of [course.admin, course.student, stranger])
		await expect(
			decideAward(await one.caller(), { awardId, decision: 'award' })
		).rejects.toMatchObject({ code: 'absent' });
});

it('cannot be decided by its own student, whatever their roles', async () => {
	const awardId = await proposed();
	const { personId } = course.student;
	await course.house.database.sequelize.query(
		`INSERT INTO person_roles (schoolId, personId, role, givenAt) VALUES ('${course.school}', '${personId}', 'verifier', '2026')`
	);
	const caller = await course.student.caller();
	expect(await readAward(caller, { awardId })).toMatchObject({ mayDecide: false, isOwn: true });
	await expect(decideAward(caller, { awardId, decision: 'award' })).rejects.toMatchObject({
		code: 'absent'
	});
});

it('shows the evidence, and once awarded stands as it was then', async () => {
	const awardId = await proposed();
	const caller = await course.verifier.caller();
	const shown = await readAward(caller, { awardId });
	expect(shown).toMatchObject({
		studentName: 'Ilka Brandt',
		markerNames: ['Marit Oyelaran'],
		mayDecide: true,
		evidence: {
			bench: { minutes: 180, neededMinutes: 180 },
			tasks: [{ stepKey: 'pin-sheet', engine: 'AV4-2200D', decision: 'competent' }],
			notAssessed: ['Teardown of an engine', 'Failure causes']
		}
	});
	const { state, certificateId } = await decideAward(caller, { awardId, decision: 'award' });
	expect(state).toBe('awarded');
	const made = await find(course.house.look, certificates, { id: certificateId ?? '' });
	expect(made?.face).toMatchObject({
		personName: 'Ilka Brandt',
		decidedBy: { name: 'Halvard Quist' },
		benchMinutes: 180
	});
	expect(await lettersOf('certificate-ready')).toEqual([course.student.email]);
	await expect(decideAward(caller, { awardId, decision: 'decline' })).rejects.toMatchObject({
		code: 'conflict'
	});
});

it('asks the rule again: what is not met any more is not awarded', async () => {
	const awardId = await proposed();
	await course.house.database.sequelize.query('DELETE FROM bench_hours');
	const decide = decideAward(await course.verifier.caller(), { awardId, decision: 'award' });
	await expect(decide).rejects.toMatchObject({ code: 'conflict' });
	expect(await select(course.house.look, certificates)).toEqual([]);
});

it('is declined with a reason, however long, that the student reads; then it can come again', async () => {
	const awardId = await proposed();
	const caller = await course.verifier.caller();
	await expect(decideAward(caller, { awardId, decision: 'decline' })).rejects.toMatchObject({
		fields: { reason: ['Say why: the student reads it.'] }
	});
	const reason = 'The photographs do not show the pin. '.repeat(20).trim();
	await decideAward(caller, { awardId, decision: 'decline', reason });
	const [letter] = await select(course.house.look, mails, { kind: 'award-decided' });
	expect(letter?.recipient).toBe(course.student.email);
	expect(letter?.payload).toMatchObject({ decision: 'declined', reason });
	await course.enterHours(1);
	expect((await waiting()).map((one) => one.state).toSorted()).toEqual(['declined', 'waiting']);
});
