import { error } from '@sveltejs/kit';
import { lessonComponents } from '$lib/content/lesson-components';
import type { PageLoad } from './$types';

/** The lesson's text is a component of the build; its values and what was watched come with the data. */
export const load: PageLoad = async ({ data }) => {
	const component = data.file === null ? undefined : lessonComponents[data.file];
	if (!component) error(404, { message: 'The text of this lesson is not here.' });
	return { ...data, Text: (await component()).default };
};
