import { z } from 'zod';
import { allSchools } from '../../data/queries/schools';
import { readCase } from '../use-case';

/** Whether the database answers: what a load balancer asks. */
export const readReady = readCase({
	name: 'read-ready',
	action: 'site:read',
	where: 'common',
	input: z.object({}).default({}),
	subject: () => Promise.resolve({}),
	async run({ scope }) {
		await allSchools(scope);
		return { ready: true };
	}
});
