/**
 * The one place that globs `lessons/`: everything else asks the catalogue. Vite reads the options
 * from the text, so each call spells them out.
 */
export const files = {
	engines: import.meta.glob<string>('/lessons/engines/*.yaml', {
		query: '?raw',
		import: 'default',
		eager: true
	}),
	courses: import.meta.glob<string>('/lessons/courses/*/course.yaml', {
		query: '?raw',
		import: 'default',
		eager: true
	}),
	questions: import.meta.glob<string>('/lessons/courses/*/questions/*.yaml', {
		query: '?raw',
		import: 'default',
		eager: true
	}),
	quizzes: import.meta.glob<string>('/lessons/courses/*/quizzes/*.yaml', {
		query: '?raw',
		import: 'default',
		eager: true
	}),
	jobSheets: import.meta.glob<string>('/lessons/courses/*/job-sheets/*.yaml', {
		query: '?raw',
		import: 'default',
		eager: true
	}),
	lessonTexts: import.meta.glob<string>('/lessons/courses/*/*/lesson.svx', {
		query: '?raw',
		import: 'default',
		eager: true
	}),
	lessonMetadata: import.meta.glob<unknown>('/lessons/courses/*/*/lesson.svx', {
		import: 'metadata',
		eager: true
	}),
	captions: import.meta.glob<string>('/lessons/courses/*/*/captions.en.vtt', {
		query: '?raw',
		import: 'default',
		eager: true
	}),
	chapters: import.meta.glob<string>('/lessons/courses/*/*/chapters.en.vtt', {
		query: '?raw',
		import: 'default',
		eager: true
	}),
	addresses: import.meta.glob<string>(
		'/lessons/courses/*/*/{captions.en.vtt,chapters.en.vtt,film.webm,film.mp4,poster.webp}',
		// A caption file must stay a file: small ones would become data: addresses, which the CSP refuses.
		{ query: '?url&no-inline', import: 'default', eager: true }
	)
};
