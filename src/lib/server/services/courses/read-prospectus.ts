import { z } from 'zod';
import type { Course } from '$lib/domain/courses/schema';
import { newestRevisions } from '../../data/queries/publications';
import { allSchools } from '../../data/queries/schools';
import { within } from '../../data/scope';
import { readCase } from '../use-case';

/** The public list of courses, school by school. */
export const readProspectus = readCase({
	name: 'read-prospectus',
	action: 'prospectus:read',
	where: 'common',
	input: z.object({}).default({}),
	subject: () => Promise.resolve({}),
	async run({ scope }) {
		const schools = await allSchools(scope);
		const listed = await Promise.all(
			schools.map(async ({ id, name, town, locale, currency }) => ({
				name,
				town,
				locale,
				courses: (await newestRevisions(within(scope, id), 'course')).map(({ body }) => {
					const { key, title, summary, outcomes, steps, hours, priceMinor, award } = body as Course;
					return {
						key,
						title,
						summary,
						outcomes: outcomes.map((one) => one.words),
						steps: steps.map(({ kind, title: words }) => ({ kind, title: words })),
						hours,
						benchHours: award.benchHours,
						price: { amountMinor: priceMinor, currency }
					};
				})
			}))
		);
		return { schools: listed.filter((one) => one.courses.length > 0) };
	}
});
