import { catalogue } from '$lib/content/catalogue';
import type { JobSheet } from '$lib/domain/job-sheets/schema';
import { people, sittings, submissions } from '$lib/server/data/models';
import { revisionsOfAttempt } from '$lib/server/data/queries/attempt-context';
import { setStepState } from '$lib/server/data/queries/enrolments';
import { newestRevision } from '$lib/server/data/queries/publications';
import { findSubmission } from '$lib/server/data/queries/submissions';
import { find, insert, update } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { acceptInvitation } from '$lib/server/services/cohorts/accept-invitation';
import { recordPayment } from '$lib/server/services/cohorts/buy-places';
import { createCohort } from '$lib/server/services/cohorts/create-cohort';
import { applyCohortRoster } from '$lib/server/services/cohorts/plan-roster';
import { takeCourse } from '$lib/server/services/courses/take-course';
import { signMark } from '$lib/server/services/marking/sign-mark';
import { takeForMarking } from '$lib/server/services/marking/take-for-marking';
import { enterBenchHours } from '$lib/server/services/progress/bench-hours';
import { openSubmission } from '$lib/server/services/submissions/open-submission';
import { callerAs, makeHouse, type TestHouse, type TestPerson } from '../../support/house';

const courseKey = 'crankpins-of-a-diesel';
const dayMs = 24 * 3600 * 1000;

export type Course = {
	house: TestHouse;
	school: string;
	admin: TestPerson;
	/** Marked the work, and is a verifier as well. */
	marker: TestPerson;
	/** A verifier who marked nothing. */
	verifier: TestPerson;
	student: TestPerson;
	enrolmentId: string;
	/** The last thing that the rule asks for: with it, the award is put to the verifiers. */
	enterHours: (hours: number) => Promise<void>;
};

/** A student who has everything but the bench hours: enrolled, quizzed and marked as they come. */
export async function almostFinished(): Promise<Course> {
	const house = await makeHouse({ catalogue: catalogue() });
	const school = await house.addSchool('averholm');
	const admin = await house.addPerson(school, 'Ragna Holt', ['admin']);
	const marker = await house.addPerson(school, 'Marit Oyelaran', ['instructor', 'verifier']);
	const verifier = await house.addPerson(school, 'Halvard Quist', ['verifier']);
	await takeCourse(await admin.caller(), { courseKey, schoolId: school });
	const { cohortId } = await createCohort(await admin.caller(), {
		title: 'Spring',
		courseKey,
		startsOn: '2026-03-02',
		endsOn: '2026-06-01',
		instructorId: marker.personId
	});
	const paid = { quantity: 1, method: 'bank-transfer', reference: 'BT-1' };
	await recordPayment(await admin.caller(), { cohortId, ...paid });
	const student = await house.addPerson(school, 'Ilka Brandt', ['student']);
	const list = `Ilka Brandt,${student.email}`;
	await applyCohortRoster(await admin.caller(), { cohortId, list });
	const { links } = await house.linksOfLetter(student.email);
	const token = links.link?.split('/').at(-1);
	await acceptInvitation(callerAs(house, (await student.caller()).actor), { token });
	const enrolmentId = await enrolmentOf(house, student);
	house.passMs(dayMs);
	await layLessonAndQuiz(house, school, { enrolmentId, personId: student.personId });
	await doJobSheet(house, school, { enrolmentId, student, marker });
	await house.work();
	return {
		house,
		school,
		admin,
		marker,
		verifier,
		student,
		enrolmentId,
		async enterHours(hours) {
			const asked = { enrolmentId, onDay: '2026-03-03', hours, what: 'Pins of the AV4' };
			await enterBenchHours(await marker.caller(), asked);
			await house.work();
		}
	};
}

async function enrolmentOf(house: TestHouse, student: TestPerson): Promise<string> {
	const [row] = (await house.database.sequelize.query(
		`SELECT id FROM enrolments WHERE personId = '${student.personId}'`
	)) as unknown as [{ id: string }[]];
	return row[0]?.id ?? '';
}

/** Their own tests play these; here only what is left behind by them matters. */
async function layLessonAndQuiz(
	house: TestHouse,
	school: string,
	of: { enrolmentId: string; personId: string }
) {
	const at = house.now().toISOString();
	await house.lay(async (common) => {
		const scope = within(common, school);
		const quiz = await newestRevision(scope, 'quiz', 'pin-and-bore');
		const sheet = await newestRevision(scope, 'data-sheet', 'av4-2200d');
		if (!quiz || !sheet || !(await find(scope, people, { id: of.personId })))
			throw new Error('the course is published and the student in it');
		for (const stepKey of ['measuring', 'pin-quiz'])
			await setStepState(scope, { enrolmentId: of.enrolmentId, stepKey }, done(at));
		await insert(scope, sittings, {
			id: 'sitting',
			...of,
			stepKey: 'pin-quiz',
			quizId: quiz.publicationId,
			quizRevisionId: quiz.id,
			sheetRevisionId: sheet.id,
			number: 1,
			state: 'ended',
			epoch: 1,
			startedAt: at,
			deadlineAt: null,
			endedAt: at,
			endedBecause: 'handed-in',
			points: 9,
			possible: 10,
			passed: 1
		});
	});
}

const done = (updatedAt: string) => ({ state: 'competent' as const, updatedAt });

async function doJobSheet(
	house: TestHouse,
	school: string,
	who: { enrolmentId: string; student: TestPerson; marker: TestPerson }
) {
	const opened = { enrolmentId: who.enrolmentId, stepKey: 'pin-sheet' };
	const { submissionId } = await openSubmission(await who.student.caller(), opened);
	await house.lay(async (common) => {
		const handedIn = { state: 'handed-in' as const, handedInAt: house.now().toISOString() };
		await update(within(common, school), submissions, { id: submissionId }, handedIn);
	});
	const scope = within(house.look, school);
	const attempt = await findSubmission(scope, submissionId);
	if (!attempt) throw new Error('it was opened');
	const { jobSheet } = await revisionsOfAttempt(scope, attempt);
	const caller = await who.marker.caller();
	await takeForMarking(caller, { submissionId });
	await signMark(caller, { submissionId, rows: rowsFor(jobSheet, who.marker.personId) });
}

const rowsFor = ({ scheme }: JobSheet, witnessId: string) =>
	scheme.criteria.map((one) => ({
		criterion: one.key,
		level: one.levels.length - 1,
		witnessId: one.needsWitness ? witnessId : null
	}));
