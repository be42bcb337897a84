import { error } from '@sveltejs/kit';
import { catalogue } from '$lib/content/catalogue';
import type { PageLoad } from './$types';

/** The lesson's text is a component of the build; its values and what was watched come with the data. */
export const load: PageLoad = async ({ data }) => {
	const lesson = catalogue().lessonByKey(data.lessonKey);
	if (!lesson) error(404, { message: 'The text of this lesson is not here.' });
	const { filmFiles } = lesson;
	return { ...data, Text: await lesson.load(), filmFiles };
};
