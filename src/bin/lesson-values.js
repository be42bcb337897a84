import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { parse } from 'yaml';

/** Components of a lesson that take a value of the data sheet by its key. */
const takesKey = /<[A-Z]\w*\b[^>]*?\bk="([^"]+)"/g;
const lists = ['dimensions', 'fasteners', 'patterns', 'oversizes', 'shims', 'ports', 'weakPoints'];

/**
 * Every value that a lesson names must stand on its engine's data sheet: a lesson with a key that
 * is missing is not compiled, and the build stops at its file and line.
 * @type {import('svelte/compiler').PreprocessorGroup}
 */
export const lessonValues = {
	name: 'lesson-values',
	markup({ content, filename }) {
		if (filename?.endsWith('.svx')) checkLesson(content, filename);
	}
};

/**
 * @param {string} text a lesson's source
 * @param {string} file where it lies: `lessons/courses/<course>/<lesson>/lesson.svx`
 * @throws {Error} `file:line: the data sheet … has no …`
 */
export function checkLesson(text, file) {
	const course = join(dirname(file), '..', 'course.yaml');
	if (!existsSync(course)) return;
	const { engine } = parse(readFileSync(course, 'utf8'));
	const sheetFile = join(dirname(course), '..', '..', 'engines', `${engine}.yaml`);
	const sheet = parse(readFileSync(sheetFile, 'utf8'));
	const keys = new Set(
		lists.flatMap((list) =>
			(sheet[list] ?? []).map((/** @type {{ key: string }} */ one) => one.key)
		)
	);
	for (const [at, line] of text.split('\n').entries())
		for (const [, key = ''] of line.matchAll(takesKey))
			if (!keys.has(key))
				throw new Error(`${file}:${at + 1}: the data sheet ${sheet.code} has no ${key}`);
}
