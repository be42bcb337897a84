import { catalogue } from '$lib/content/catalogue';
import { orders, places, rosterEntries } from '$lib/server/data/models';
import { count, select } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { createCohort } from '$lib/server/services/cohorts/create-cohort';
import { takeCourse } from '$lib/server/services/courses/take-course';
import { makeHouse, type TestHouse, type TestPerson } from '../../support/house';
import { openTill, type TestTill } from '../../support/till';

/** A school's office with one cohort, at a till that answers. */
export type Office = {
	house: TestHouse;
	till: TestTill;
	school: string;
	otherSchool: string;
	admin: TestPerson;
	instructor: TestPerson;
	cohortId: string;
	/** How many places are open. */
	places: () => Promise<number>;
	/** Where each of the roster stands, in its order. */
	roster: () => Promise<string[]>;
	orders: () => Promise<string[]>;
	/** The token in the newest invitation to somebody. */
	tokenOf: (email: string) => Promise<string>;
	close: () => Promise<void>;
};

export const courseKey = 'crankpins-of-a-diesel';

export async function openOffice(): Promise<Office> {
	const till = await openTill();
	const house = await makeHouse({ catalogue: catalogue(), environment: till.environment });
	const school = await house.addSchool('averholm');
	const otherSchool = await house.addSchool('korrig');
	const admin = await house.addPerson(school, 'Ragna Holt', ['admin']);
	const instructor = await house.addPerson(school, 'Marit Oyelaran', ['instructor']);
	await takeCourse(await admin.caller(), { courseKey, schoolId: school });
	const { cohortId } = await createCohort(await admin.caller(), {
		title: 'Spring',
		courseKey,
		startsOn: '2026-04-01',
		endsOn: '2026-06-01',
		instructorId: instructor.personId
	});
	const inSchool = within(house.look, school);
	return {
		house,
		till,
		school,
		otherSchool,
		admin,
		instructor,
		cohortId,
		places: () => count(inSchool, places, { cohortId }),
		async roster() {
			const order = [['createdAt', 'asc'] as const, ['id', 'asc'] as const];
			const entries = await select(inSchool, rosterEntries, { cohortId }, { order });
			return entries.map((one) => `${one.email} ${one.state}`);
		},
		orders: async () => (await select(inSchool, orders, { cohortId })).map((one) => one.state),
		async tokenOf(email) {
			const { links } = await house.linksOfLetter(email);
			return links.link?.split('/').at(-1) ?? '';
		},
		async close() {
			await house.close();
			await till.close();
		}
	};
}
