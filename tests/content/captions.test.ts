import { statSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';

const withFilm = catalogue().courses.flatMap(({ lessons }) =>
	lessons.flatMap((lesson) =>
		lesson.filmFiles ? [[lesson.key, lesson, lesson.filmFiles] as const] : []
	)
);

it('at least two lessons have a film of ninety seconds or more', () => {
	expect(withFilm.filter(([, , film]) => film.durationS >= 90).length).toBeGreaterThanOrEqual(2);
});

/** Reading a caption file without a fault of the parser is the catalogue's own condition. */
describe.each(withFilm)('the film of %s', (_, lesson, film) => {
	it('has captions that can be read in their time', () => {
		for (const { startS, endS, text } of film.cues) {
			// BBC subtitle guidelines: 160 to 180 words a minute at most, here held to 180.
			const words = text.split(' ').length;
			expect(words / ((endS - startS) / 60), text).toBeLessThanOrEqual(180);
			// DCMP captioning key: at least 1 s on screen; two lines of at most 42 characters (common practice).
			expect(endS - startS).toBeGreaterThanOrEqual(1);
			expect(text.length).toBeLessThanOrEqual(84);
		}
	});

	it('has captions in order, without overlap, that end with it', () => {
		for (const [index, cue] of film.cues.entries()) {
			expect(cue.endS).toBeGreaterThan(cue.startS);
			expect(cue.startS).toBeGreaterThanOrEqual(film.cues[index - 1]?.endS ?? 0);
		}
		expect(film.cues.at(-1)?.endS).toBeLessThanOrEqual(film.durationS);
	});

	it('has chapters that cover it without a gap', () => {
		expect(film.chapterCues.length).toBeGreaterThanOrEqual(2);
		expect(film.chapterCues[0]?.startS).toBe(0);
		for (const [index, chapter] of film.chapterCues.entries())
			if (index > 0) expect(chapter.startS).toBe(film.chapterCues[index - 1]?.endS);
		expect(film.chapterCues.at(-1)?.endS).toBe(film.durationS);
	});

	it('is small enough to be fetched in a workshop', () => {
		const folder = lesson.file.replace(/^\//, '').replace(/lesson\.svx$/, '');
		for (const name of ['film.webm', 'film.mp4'])
			expect(statSync(join(folder, name)).size).toBeLessThan(3_000_000);
	});
});
