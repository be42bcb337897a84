import { z } from 'zod';
import { allSchools } from '../../data/queries/schools';
import { readCase } from '../use-case';

/** Whether requests can be served: the database answers. It says nothing about anybody. */
export const readReadiness = readCase({
	name: 'read-readiness',
	action: 'site:read',
	where: 'common',
	input: z.object({}),
	subject: () => Promise.resolve({}),
	async run({ scope }) {
		await allSchools(scope);
		return { ready: true };
	}
});
