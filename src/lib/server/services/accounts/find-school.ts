import { z } from 'zod';
import { findSchool } from '../../data/queries/schools';
import { readCase } from '../use-case';

export type SchoolFace = {
	id: string;
	slug: string;
	name: string;
	town: string;
	locale: string;
	timeZone: string;
	currency: string;
};

/** The school that an address names; null where there is none. What a school is called is public. */
export const schoolAtAddress = readCase({
	name: 'school-at-address',
	action: 'site:read',
	where: 'common',
	input: z.object({ slug: z.string().max(80) }),
	subject: () => Promise.resolve({}),
	async run({ scope, input }): Promise<SchoolFace | null> {
		const found = await findSchool(scope, input.slug);
		if (!found) return null;
		const { id, slug, name, town, locale, timeZone, currency } = found;
		return { id, slug, name, town, locale, timeZone, currency };
	}
});
