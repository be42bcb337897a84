/** The one place that globs `lessons/`: everything else asks the catalogue. */
const raw = { query: '?raw', import: 'default', eager: true } as const;
// A caption file must stay a file: small ones would become data: addresses, which the CSP refuses.
const address = { query: '?url&no-inline', import: 'default', eager: true } as const;

export const files = {
	engines: import.meta.glob<string>('/lessons/engines/*.yaml', raw),
	courses: import.meta.glob<string>('/lessons/courses/*/course.yaml', raw),
	questions: import.meta.glob<string>('/lessons/courses/*/questions/*.yaml', raw),
	quizzes: import.meta.glob<string>('/lessons/courses/*/quizzes/*.yaml', raw),
	jobSheets: import.meta.glob<string>('/lessons/courses/*/job-sheets/*.yaml', raw),
	lessonTexts: import.meta.glob<string>('/lessons/courses/*/*/lesson.svx', raw),
	lessonMetadata: import.meta.glob<unknown>('/lessons/courses/*/*/lesson.svx', {
		import: 'metadata',
		eager: true
	}),
	captions: import.meta.glob<string>('/lessons/courses/*/*/captions.en.vtt', raw),
	chapters: import.meta.glob<string>('/lessons/courses/*/*/chapters.en.vtt', raw),
	addresses: import.meta.glob<string>(
		'/lessons/courses/*/*/{captions.en.vtt,chapters.en.vtt,film.webm,film.mp4,poster.webp}',
		address
	)
};
