import { existsSync } from 'node:fs';
import { readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { system, type Role } from '$lib/domain/actor';
import { awards, certificates, jobs, mails } from '../data/models';
import { find, select, update } from '../data/rows';
import { commonScope, schoolScope } from '../data/scope';
import { inTransaction } from '../data/transaction';
import { decideAward } from '../services/awards/decide-award';
import { withdrawCertificate } from '../services/awards/certificates';
import { proposeAward } from '../services/awards/propose-award';
import { takeCourse } from '../services/courses/take-course';
import type { House } from '../services/house';
import { enrolCohort } from './enrol';
import { playStudent } from './play-student';
import { openSchool, openStage, type SchoolCast, type Stage } from './stage';
import { averholmStudents, korrigStudents, type Plan } from './students';

type Show = {
	cast: SchoolCast;
	courseKey: string;
	cohortTitle: string;
	places: number;
	students: readonly Plan[];
};

const both: readonly Role[] = ['instructor'];
const staff = (
	domain: string,
	names: readonly [string, string, string, string]
): SchoolCast['staff'] => [
	{ email: `instructor@${domain}`, name: names[0], roles: both },
	{ email: `instructor2@${domain}`, name: names[1], roles: both },
	{ email: `verifier@${domain}`, name: names[2], roles: ['verifier'] },
	{ email: `office@${domain}`, name: names[3], roles: ['admin'] }
];

const shows: readonly Show[] = [
	{
		cast: {
			slug: 'averholm',
			name: 'Averholm Trade School',
			town: 'Averholm',
			staff: staff('averholm.example', [
				'Marit Oyelaran',
				'Rune Castellane',
				'Halvard Quist',
				'Oskar Tindvik'
			])
		},
		courseKey: 'reading-failed-engines',
		cohortTitle: 'Autumn intake, yard group',
		places: 14,
		students: averholmStudents
	},
	{
		cast: {
			slug: 'korrig',
			name: 'Korrig Point Engine School',
			town: 'Korrig Point',
			staff: staff('korrig.example', [
				'Tove Lindqvaer',
				'Anselm Brekke',
				'Yara Fjeldsted',
				'Nils Ombria'
			])
		},
		courseKey: 'crankpins-of-a-diesel',
		cohortTitle: 'Harbour evenings',
		places: 4,
		students: korrigStudents
	}
];

/** Sixty days before the first start, so that the demo's cohort is in the middle of its course. */
const openedDaysAgo = 60;
const dayMs = 24 * 3600 * 1000;

/**
 * Plays the demo into an empty installation, once. Interrupted, it goes on where it stopped at
 * the next start; finished, a file in the data folder says so.
 */
export async function seedDemo(house: House): Promise<void> {
	const { DATA_DIR } = house.config;
	const done = join(DATA_DIR, 'demo-seeded');
	if (existsSync(done)) return;
	const opening = await openingDay(house, join(DATA_DIR, 'demo-opening'));
	const begun = Date.now();
	house.log.info('seeding the demo');
	const stage = openStage(house, opening);
	for (const show of shows) await playShow(stage, show);
	await settleHistory(house);
	await writeFile(done, `${house.now().toISOString()}\n`);
	house.log.info({ seconds: Math.round((Date.now() - begun) / 1000) }, 'demo seeded');
}

/** The opening stays the same over an interruption: every key is made from it. */
async function openingDay(house: House, file: string): Promise<Date> {
	if (existsSync(file)) return new Date((await readFile(file, 'utf8')).trim());
	const opening = new Date(house.now().getTime() - openedDaysAgo * dayMs);
	opening.setUTCHours(0, 0, 0, 0);
	await writeFile(file, opening.toISOString());
	return opening;
}

async function playShow(stage: Stage, show: Show): Promise<void> {
	stage.at(0);
	const schoolId = await openSchool(stage, show.cast);
	const domain = `${show.cast.slug}.example`;
	await takeCourse(stage.as(system, schoolId, `take/${show.courseKey}`), {
		courseKey: show.courseKey,
		schoolId
	});
	const fromDay = 14;
	await enrolCohort(stage, {
		schoolId,
		office: `office@${domain}`,
		instructor: `instructor@${domain}`,
		title: show.cohortTitle,
		courseKey: show.courseKey,
		fromDay,
		toDay: 102,
		places: show.places,
		students: show.students.map(({ email, name, comes = true }) => ({ email, name, comes }))
	});
	const markers = await Promise.all(
		['instructor', 'instructor2'].map((name) => stage.actor(`${name}@${domain}`))
	);
	for (const [index, plan] of show.students.entries()) {
		if (plan.comes === false) continue;
		const enrolmentId = await playStudent(stage, plan, { schoolId, markers, fromDay }, index);
		if (['award-waiting', 'awarded', 'withdrawn'].includes(plan.then))
			await playAward(stage, schoolId, enrolmentId, plan.then, `verifier@${domain}`);
	}
}

async function playAward(
	stage: Stage,
	schoolId: string,
	enrolmentId: string,
	then: string,
	email: string
) {
	stage.at(54, 15);
	await proposeAward({ house: stage.house, actor: system, schoolId: undefined }, { enrolmentId });
	const scope = schoolScope(stage.house.database, schoolId, null);
	const award = await find(scope, awards, { enrolmentId });
	if (!award) throw new Error('the rule is not met');
	if (then === 'award-waiting' || award.state !== 'waiting') return;
	const verifier = await stage.actor(email);
	stage.at(55, 11);
	await decideAward(stage.as(verifier, schoolId, `${award.id}/decide`), {
		awardId: award.id,
		decision: 'award'
	});
	if (then !== 'withdrawn') return;
	const certificate = await find(scope, certificates, { awardId: award.id });
	stage.at(57, 11);
	await withdrawCertificate(stage.as(verifier, schoolId, `${award.id}/withdraw`), {
		certificateId: certificate?.id,
		reason: 'The readings of the second job sheet turned out to be another student’s.'
	});
}

/** Letters of the past count as sent: their links are used up, and nobody is written to about them. */
async function settleHistory(house: House): Promise<void> {
	await inTransaction(house.database, async (transaction) => {
		const scope = commonScope(house.database, transaction);
		for (const { id, createdAt } of await select(scope, mails, { state: 'waiting' }))
			await update(
				scope,
				mails,
				{ id },
				{ state: 'sent', sentAt: createdAt, sealed: null, attempts: 1 }
			);
		const endedAt = house.now().toISOString();
		await update(
			scope,
			jobs,
			{ kind: ['send-mail', 'propose-award'], state: 'waiting' },
			{ state: 'done', endedAt }
		);
	});
}
