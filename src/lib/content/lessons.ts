import type { Component } from 'svelte';
import { lessonMetadataSchema, type Cue, type LessonMetadata } from '$lib/domain/courses/lesson';
import { readCues } from './captions';
import { ContentFault, parsed } from './fault';
import { files } from './files';
import { lessonComponents } from './lesson-components';

export type LessonFilm = {
	title: string;
	durationS: number;
	webm: string;
	mp4: string;
	poster: string;
	captions: string;
	chapters: string;
	cues: Cue[];
	chapterCues: Cue[];
};

export type Lesson = LessonMetadata & {
	key: string;
	courseKey: string;
	file: string;
	text: string;
	/** Keys of the data sheet that the text takes its values from, with the line of each. */
	values: { key: string; line: number }[];
	filmFiles: LessonFilm | null;
	load: () => Promise<Component>;
};

/** `/lessons/courses/<course>/<nn-lesson>/lesson.svx`: the folder's name without its number is the key. */
export function readLessons(): Lesson[] {
	return Object.entries(files.lessonTexts).map(([file, text]) => {
		const [, , , courseKey = '', folder = ''] = file.split('/');
		const metadata = parsed(lessonMetadataSchema, file, files.lessonMetadata[file]);
		const component = lessonComponents[file];
		if (!component) throw new ContentFault(file, 'it was not compiled');
		return {
			...metadata,
			key: folder.replace(/^\d+-/, ''),
			courseKey,
			file,
			text,
			values: valuesIn(text),
			filmFiles: metadata.film ? readFilm(file, metadata.film) : null,
			load: async () => (await component()).default
		};
	});
}

function readFilm(lessonFile: string, film: NonNullable<LessonMetadata['film']>): LessonFilm {
	const folder = lessonFile.replace(/lesson\.svx$/, '');
	const address = (name: string) => {
		const found = files.addresses[folder + name];
		if (!found) throw new ContentFault(lessonFile, `its film has no ${name}`);
		return found;
	};
	const text = (from: Record<string, string>, name: string) => {
		const found = from[folder + name];
		if (found === undefined) throw new ContentFault(lessonFile, `its film has no ${name}`);
		return readCues(folder + name, found);
	};
	return {
		...film,
		webm: address('film.webm'),
		mp4: address('film.mp4'),
		poster: address('poster.webp'),
		captions: address('captions.en.vtt'),
		chapters: address('chapters.en.vtt'),
		cues: text(files.captions, 'captions.en.vtt'),
		chapterCues: text(files.chapters, 'chapters.en.vtt')
	};
}

function valuesIn(text: string): { key: string; line: number }[] {
	return text.split('\n').flatMap((words, index) =>
		[...words.matchAll(/<Value\b[^>]*?\bk="([^"]+)"/g)].map((found) => ({
			key: found[1] ?? '',
			line: index + 1
		}))
	);
}
