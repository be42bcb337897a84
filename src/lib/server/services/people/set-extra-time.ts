import { z } from 'zod';
import { people } from '../../data/models';
import { findPerson } from '../../data/queries/schools';
import { update } from '../../data/rows';
import { writeCase } from '../use-case';

/** More time in every quiz that is opened from now on, in percent of its own time. */
export const setExtraTime = writeCase({
	name: 'set-extra-time',
	action: 'people:edit',
	input: z.object({
		personId: z.string().min(1),
		extraTimePercent: z.coerce
			.number('Give a whole number of percent.')
			.int('Give a whole number of percent.')
			.min(0, 'Give 0 to 300 percent.')
			.max(300, 'Give 0 to 300 percent.')
	}),
	async subject({ scope, input }) {
		const person = await findPerson(scope, input.personId);
		return person && { schoolId: scope.schoolId, person };
	},
	async run({ scope, subject: { person }, input, record }) {
		const { extraTimePercent } = input;
		if (extraTimePercent === person.extraTimePercent) return;
		await update(scope, people, { id: person.id }, { extraTimePercent });
		// How much, and why, is the person's own affair: the ledger says only that it changed.
		await record({ kind: 'extra-time-changed', subject: person.id, data: {} });
	}
});
