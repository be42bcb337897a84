import { z } from 'zod';
import { waitingToBeMarked } from '../../data/queries/submissions';
import { readCase } from '../use-case';

/** The marking list: what waits, oldest first, and who has it open. */
export const listWaiting = readCase({
	name: 'list-waiting',
	action: 'marking:list',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, at, me }) {
		const waiting = await waitingToBeMarked(scope, at.toISOString());
		return {
			waiting: waiting.map(({ ownerId, leaseHolderId, ...line }) => ({
				...line,
				own: ownerId === me,
				withYou: leaseHolderId === me,
				withAnother: leaseHolderId !== null && leaseHolderId !== me
			}))
		};
	}
});
