import { z } from 'zod';
import { membershipIn } from '$lib/domain/actor';
import { schoolById } from '../../data/queries/schools';
import { readCase } from '../use-case';

/** The school around a page, for those who are in it. */
export const readSchool = readCase({
	name: 'read-school',
	action: 'school:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, actor }) {
		const school = await schoolById(scope, scope.schoolId);
		if (!school) throw new Error('a school that somebody is in is gone');
		const { slug, name, town, locale, timeZone, currency } = school;
		const roles = membershipIn(actor, scope.schoolId)?.roles ?? [];
		return { school: { slug, name, town, locale, timeZone, currency }, roles: [...roles] };
	}
});
