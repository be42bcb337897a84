import type { Actor } from '$lib/domain/actor';
import type { Course } from '$lib/domain/courses/schema';
import { seeded } from '$lib/kernel/random/random';
import { enrolmentsOfPerson } from '../data/queries/enrolments';
import { revisionById } from '../data/queries/publications';
import { schoolScope } from '../data/scope';
import { enterBenchHours } from '../services/progress/bench-hours';
import { playJobSheet, type Ending } from './play-job-sheet';
import { playLesson } from './play-lesson';
import { playQuiz } from './play-quiz';
import type { Stage } from './stage';
import type { Plan } from './students';

type Crew = { schoolId: string; markers: readonly Actor[]; fromDay: number };

/** Plays one student through the course as far as their plan says. @returns the enrolment */
export async function playStudent(
	stage: Stage,
	plan: Plan,
	crew: Crew,
	index: number
): Promise<string> {
	const { schoolId, markers, fromDay } = crew;
	const scope = schoolScope(stage.house.database, schoolId, null);
	const who = await stage.actor(plan.email);
	const me = who.kind === 'account' ? (who.memberships[0]?.personId ?? '') : '';
	const [enrolment] = await enrolmentsOfPerson(scope, me);
	if (!enrolment) throw new Error(`${plan.name} is not enrolled`);
	const course = (await revisionById(scope, enrolment.courseRevisionId))?.body as Course;
	const random = seeded(`demo/${plan.email}`);
	const marker = markers[index % markers.length];
	if (!marker) throw new Error('nobody marks');
	for (const [step, { key, kind }] of course.steps.entries()) {
		if (step > plan.done || (step === plan.done && plan.then === 'nothing')) break;
		const done = step < plan.done;
		stage.at(fromDay + 2 + step * 5 + (index % 4), 10 + (index % 6), index * 3);
		const where = { schoolId, enrolmentId: enrolment.id, stepKey: key };
		if (kind === 'lesson') await playLesson(stage, who, where, done);
		else if (kind === 'quiz')
			await playQuiz(stage, who, where, { ability: done ? 0.94 : 0.6, random, handIn: done });
		else await playJobSheet(stage, who, marker, where, { random, ending: endingOf(plan, done) });
	}
	await playHours(stage, plan, enrolment.id, marker, crew);
	return enrolment.id;
}

function endingOf(plan: Plan, done: boolean): Ending {
	if (done) return 'competent';
	return plan.then === 'waiting' ? 'handed-in' : plan.then === 'sent-back' ? 'not-yet' : 'open';
}

async function playHours(stage: Stage, plan: Plan, enrolmentId: string, marker: Actor, crew: Crew) {
	const work = [
		'Strip-down of the bottom end',
		'Measuring pins and bores',
		'Looking at shells and screen',
		'Cleaning and laying out'
	];
	let left = plan.benchHours;
	for (let i = 0; left > 0 && i < 12; i++) {
		const hours = Math.min(left, 3.5);
		left -= hours;
		stage.at(crew.fromDay + 3 + i * 6, 16);
		await enterBenchHours(stage.as(marker, crew.schoolId, `${enrolmentId}/hours/${i}`), {
			enrolmentId,
			onDay: stage.day(crew.fromDay + 3 + i * 6),
			hours,
			what: work[i % work.length]
		});
	}
}
