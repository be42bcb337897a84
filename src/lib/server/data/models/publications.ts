import { instant, integer, json, key, schoolTable, text } from '../table';

export type PublicationKind =
	'course' | 'lesson' | 'question' | 'quiz' | 'job-sheet' | 'data-sheet';

/** A thing that a school publishes, under a key of its own kind. */
export const publications = schoolTable('publications', {
	id: key(),
	kind: text<PublicationKind>(),
	key: text(),
	createdAt: instant()
});

/** What it said at one time. Triggers refuse to change or delete a revision. */
export const revisions = schoolTable('revisions', {
	id: key(),
	publicationId: text(),
	number: integer(),
	title: text(),
	hash: text(),
	body: json<unknown>(),
	publishedAt: instant()
});
