import { cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { checkLesson } from '../../src/bin/lesson-values.js';

let folder: string;
const lesson = () => join(folder, 'courses/a-course/01-a-lesson/lesson.svx');
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'lessons-'));
	mkdirSync(join(folder, 'courses/a-course/01-a-lesson'), { recursive: true });
	cpSync('lessons/engines', join(folder, 'engines'), { recursive: true });
	writeFileSync(join(folder, 'courses/a-course/course.yaml'), 'engine: av3-1150\n');
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

it('lets a lesson pass whose values stand on its data sheet', () => {
	const text = readFileSync(
		'lessons/courses/reading-failed-engines/03-crankpins-and-clearances/lesson.svx',
		'utf8'
	);
	expect(text).toContain('k="');
	expect(() => checkLesson(text, lesson())).not.toThrow();
});

it('stops at the file and the line of a value that is missing', () => {
	const text =
		'one\n<Value k="crankpin.diameter" />\n\nIt is <Value inline k="crankpin.colour" />.\n';
	expect(() => checkLesson(text, lesson())).toThrow(
		`${lesson()}:4: the data sheet AV3-1150 has no crankpin.colour`
	);
});

it('leaves a file alone that is no lesson of a course', () => {
	expect(() =>
		checkLesson('<Value k="x.y" />', join(folder, 'elsewhere/lesson.svx'))
	).not.toThrow();
});
