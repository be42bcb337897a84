import { catalogue } from '$lib/content/catalogue';
import { takeCourse } from '$lib/server/services/courses/take-course';
import { makeHouse, type TestHouse, type TestPerson } from '../../support/house';

export type School = {
	house: TestHouse;
	id: string;
	admin: TestPerson;
	marit: TestPerson;
	otto: TestPerson;
	ilka: TestPerson;
	verifier: TestPerson;
};

/** A school that teaches both courses, with two instructors. */
export async function schoolWithSheets(): Promise<School> {
	const house = await makeHouse({ catalogue: catalogue() });
	const id = await house.addSchool('averholm');
	const admin = await house.addPerson(id, 'Ragna Holt', ['admin']);
	const marit = await house.addPerson(id, 'Marit Oyelaran', ['instructor']);
	const otto = await house.addPerson(id, 'Otto Berg', ['instructor']);
	const verifier = await house.addPerson(id, 'Siv Aune', ['verifier']);
	const ilka = await house.addPerson(id, 'Ilka Brandt', ['student']);
	for (const courseKey of ['crankpins-of-a-diesel', 'reading-failed-engines'])
		await takeCourse(await admin.caller(), { courseKey, schoolId: id });
	return { house, id, admin, marit, otto, ilka, verifier };
}
