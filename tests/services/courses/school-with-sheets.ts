import { catalogue } from '$lib/content/catalogue';
import { acceptInvitation } from '$lib/server/services/cohorts/accept-invitation';
import { recordPayment } from '$lib/server/services/cohorts/buy-places';
import { createCohort } from '$lib/server/services/cohorts/create-cohort';
import { applyCohortRoster } from '$lib/server/services/cohorts/plan-roster';
import { takeCourse } from '$lib/server/services/courses/take-course';
import { enrolments } from '$lib/server/data/models';
import { find } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { callerAs, makeHouse, type TestHouse, type TestPerson } from '../../support/house';

export type School = {
	house: TestHouse;
	id: string;
	admin: TestPerson;
	marit: TestPerson;
	otto: TestPerson;
	ilka: TestPerson;
	verifier: TestPerson;
};

/** A school that teaches on the AV3-1150, with two instructors. */
export async function schoolWithSheets(
	courseKeys: readonly string[] = ['reading-failed-engines']
): Promise<School> {
	const house = await makeHouse({ catalogue: catalogue() });
	const id = await house.addSchool('averholm');
	const admin = await house.addPerson(id, 'Ragna Holt', ['admin']);
	const marit = await house.addPerson(id, 'Marit Oyelaran', ['instructor']);
	const otto = await house.addPerson(id, 'Otto Berg', ['instructor']);
	const verifier = await house.addPerson(id, 'Siv Aune', ['verifier']);
	const ilka = await house.addPerson(id, 'Ilka Brandt', ['student']);
	for (const courseKey of courseKeys)
		await takeCourse(await admin.caller(), { courseKey, schoolId: id });
	return { house, id, admin, marit, otto, ilka, verifier };
}

/** Ilka goes through the course on the AV3-1150. */
export async function enrolIlka({ house, id, admin, marit, ilka }: School): Promise<string> {
	const { cohortId } = await createCohort(await admin.caller(), {
		title: 'Spring',
		courseKey: 'reading-failed-engines',
		startsOn: '2026-03-02',
		endsOn: '2026-06-01',
		instructorId: marit.personId
	});
	const paid = { quantity: 1, method: 'bank-transfer', reference: 'BT-1' };
	await recordPayment(await admin.caller(), { cohortId, ...paid });
	await applyCohortRoster(await admin.caller(), { cohortId, list: `Ilka Brandt,${ilka.email}` });
	const { links } = await house.linksOfLetter(ilka.email);
	const token = links.link?.split('/').at(-1);
	await acceptInvitation(callerAs(house, (await ilka.caller()).actor), { token });
	const row = await find(within(house.look, id), enrolments, { personId: ilka.personId });
	if (!row) throw new Error('Ilka is not enrolled');
	return row.id;
}
