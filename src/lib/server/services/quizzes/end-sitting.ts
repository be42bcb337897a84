import { z } from 'zod';
import { graceSeconds } from '$lib/domain/quizzes/deadline';
import { Problem } from '$lib/domain/problem';
import { findSitting, overdueSittings } from '../../data/queries/sittings';
import { within } from '../../data/scope';
import { writeCase } from '../use-case';
import { scoreOpenSitting } from './score-open-sitting';

export const handInSitting = writeCase({
	name: 'hand-in-sitting',
	action: 'sitting:respond',
	input: z.object({ sittingId: z.string() }),
	async subject({ scope, input }) {
		const sitting = await findSitting(scope, input.sittingId);
		return sitting && { schoolId: scope.schoolId, ownerId: sitting.personId, sitting };
	},
	async run({ scope, subject: { sitting }, at, record, enqueue }) {
		if (sitting.state !== 'open') throw new Problem('closed', 'This sitting is handed in already.');
		const late = sitting.deadlineAt !== null && sitting.deadlineAt < at.toISOString();
		const because = late ? 'time-over' : 'handed-in';
		return scoreOpenSitting(scope, sitting, because, at.toISOString(), { record, enqueue });
	}
});

/** Ends what is past its deadline and grace, whether or not anybody has the page open. */
export const endOverdueSittings = writeCase({
	name: 'end-overdue-sittings',
	action: 'system:run',
	where: 'common',
	input: z.object({}).default({}),
	subject: () => Promise.resolve({}),
	async run({ scope, at, record, enqueue }) {
		const before = new Date(at.getTime() - graceSeconds * 1000).toISOString();
		const overdue = await overdueSittings(scope, before);
		for (const sitting of overdue)
			await scoreOpenSitting(
				within(scope, sitting.schoolId),
				sitting,
				'time-over',
				at.toISOString(),
				{ record, enqueue }
			);
		return { ended: overdue.length };
	}
});
