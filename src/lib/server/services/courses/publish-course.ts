import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import { render } from 'svelte/server';
import type { CatalogueCourse } from '$lib/content/catalogue';
import type { Lesson } from '$lib/content/lessons';
import { sheetContext } from '$lib/domain/data-sheets/sheet-context';
import { dataSheetSchema, type DataSheet } from '$lib/domain/data-sheets/schema';
import { dimensionOf, fastenerOf } from '$lib/domain/data-sheets/value-of';
import { newestRevision, publish } from '../../data/queries/publications';
import type { SchoolScope } from '../../data/scope';

type Thing = Parameters<typeof publish>[1];
export type Published = { kind: string; key: string; revisionId: string };

/** A course rendered ready to be published: slow work, done before any lock is held. */
export async function prepareCourse(
	scope: SchoolScope,
	{ course, lessons, questions, quizzes, jobSheets, sheet }: CatalogueCourse
): Promise<Thing[]> {
	// A data sheet's file makes its first revision and nothing after: later ones are made here.
	const standing = await newestRevision(scope, 'data-sheet', sheet.key);
	const current = standing ? dataSheetSchema.parse(standing.body) : sheet;
	const things: Thing[] = standing ? [] : [dataSheetThing(sheet)];
	for (const lesson of lessons) things.push(await lessonThing(lesson, current));
	for (const one of questions) things.push(thing('question', one.key, one.key, one));
	for (const one of quizzes) things.push(thing('quiz', one.key, one.title, one));
	for (const one of jobSheets) things.push(thing('job-sheet', one.key, one.title, one));
	things.push(thing('course', course.key, course.title, course));
	return things;
}

/** Publishes what is new. @returns the revisions that were made */
export async function publishAll(
	scope: SchoolScope,
	things: readonly Thing[],
	newId: () => string,
	at: string
): Promise<Published[]> {
	const made: Published[] = [];
	for (const one of things) {
		const { isNew, revisionId } = await publish(scope, one, newId, at);
		if (isNew) made.push({ kind: one.kind, key: one.key, revisionId });
	}
	return made;
}

export function dataSheetThing(sheet: DataSheet): Thing {
	return thing('data-sheet', sheet.key, `${sheet.code} ${sheet.title}`, sheet);
}

function thing(kind: Thing['kind'], key: string, title: string, body: unknown): Thing {
	const plain = JSON.parse(JSON.stringify(body)) as unknown;
	return { kind, key, title, body: plain, hash: hashOf(plain) };
}

/**
 * A lesson's revision is the hash of its text, film, captions and the values in it. The text is
 * kept as it was rendered, so that what somebody read can be shown again.
 */
export async function lessonThing(lesson: Lesson, sheet: DataSheet): Promise<Thing> {
	const component = await lesson.load();
	const { body: html } = await render(component, { context: new Map([[sheetContext, { sheet }]]) });
	const film = lesson.filmFiles;
	const filmHash = film ? hashOf([film.webm, film.mp4, film.durationS]).slice(0, 16) : null;
	const values = lesson.values.map(({ key }) => dimensionOf(sheet, key) ?? fastenerOf(sheet, key));
	const body = {
		key: lesson.key,
		title: lesson.title,
		drawnBy: lesson.drawnBy,
		filmHash,
		filmSeconds: film?.durationS ?? null,
		sheetKeys: [...new Set(lesson.values.map((one) => one.key))],
		html
	};
	const plainValues = JSON.parse(JSON.stringify(values)) as unknown;
	const hash = hashOf([lesson.text, filmHash, film?.cues ?? null, plainValues]);
	return { kind: 'lesson', key: lesson.key, title: lesson.title, body, hash };
}

function hashOf(value: unknown): string {
	return createHash('sha256')
		.update(canonicalize(value) ?? '')
		.digest('hex');
}
