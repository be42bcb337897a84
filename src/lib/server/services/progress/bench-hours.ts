import { z } from 'zod';
import { inputProblem } from '$lib/domain/problem';
import { benchHoursOf } from '../../data/queries/bench-hours';
import { findEnrolment } from '../../data/queries/enrolments';
import { findPerson } from '../../data/queries/schools';
import { benchHours } from '../../data/models';
import { insert } from '../../data/rows';
import type { SchoolScope } from '../../data/scope';
import { readCase, writeCase } from '../use-case';

async function enrolmentHere(work: { scope: SchoolScope; input: { enrolmentId: string } }) {
	const enrolment = await findEnrolment(work.scope, work.input.enrolmentId);
	return enrolment && { schoolId: work.scope.schoolId, ownerId: enrolment.personId, enrolment };
}

/** Bench hours, entered by the instructor who was there: they are the witness. */
export const enterBenchHours = writeCase({
	name: 'enter-bench-hours',
	action: 'bench-hours:enter',
	input: z.object({
		enrolmentId: z.string(),
		onDay: z.iso.date('Give the day as year-month-day.'),
		hours: z.coerce
			.number('Give the hours as a number, such as 2.5.')
			.min(0.25, 'Enter a quarter of an hour at least.')
			.max(12, 'Enter at most 12 hours a day.'),
		what: z.string().trim().min(1, 'Say what was done.').max(300)
	}),
	subject: enrolmentHere,
	async run({ scope, subject: { enrolment }, input, me, at, newId, record, enqueue }) {
		if (input.onDay > at.toISOString().slice(0, 10))
			throw inputProblem({ onDay: ['This day has not come yet.'] });
		if (input.onDay < enrolment.startsOn)
			throw inputProblem({ onDay: ['This day lies before the cohort began.'] });
		const id = newId();
		const minutes = Math.round(input.hours * 60);
		const { onDay, what } = input;
		await insert(scope, benchHours, {
			id,
			enrolmentId: enrolment.id,
			onDay,
			minutes,
			what,
			witnessId: me,
			createdAt: at.toISOString()
		});
		const data = { enrolment: enrolment.id, onDay, minutes };
		await record({ kind: 'bench-hours-entered', subject: id, data });
		await enqueue({ kind: 'propose-award', payload: { enrolmentId: enrolment.id } });
		return { minutes };
	}
});

export const readBenchHours = readCase({
	name: 'read-bench-hours',
	action: 'bench-hours:enter',
	input: z.object({ enrolmentId: z.string() }),
	subject: enrolmentHere,
	async run({ scope, subject: { enrolment }, at }) {
		const rows = await benchHoursOf(scope, enrolment.id);
		const entries = await Promise.all(
			rows.map(async ({ id, onDay, minutes, what, witnessId }) => ({
				id,
				onDay,
				minutes,
				what,
				witnessName: (await findPerson(scope, witnessId))?.name ?? ''
			}))
		);
		return {
			studentName: enrolment.personName,
			cohortId: enrolment.cohortId,
			cohortTitle: enrolment.cohortTitle,
			today: at.toISOString().slice(0, 10),
			entries
		};
	}
});
