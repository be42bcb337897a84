import { instant, integer, json, key, nullable, schoolTable, text } from '../table';

export type DraftKind = 'data-sheet';

/** What somebody writes before it is published: one of each kind and key in a school. */
export const drafts = schoolTable('drafts', {
	id: key(),
	kind: text<DraftKind>(),
	key: text(),
	/** The revision that it was begun from; null for what is new. */
	basedOnRevisionId: nullable(text()),
	/** As typed, whether or not it could be published. */
	body: json<unknown>(),
	/** Grows by one with each save: what a browser names as its base. */
	version: integer(),
	createdAt: instant(),
	createdBy: text(),
	updatedAt: instant(),
	updatedBy: text()
});
