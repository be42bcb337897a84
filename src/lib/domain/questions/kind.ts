import type { z } from 'zod';
import type { Outcome } from '$lib/kernel/outcome';
import type { Step } from '../working';
import type { SheetFigures } from './sheet-figures';

export type { Step };

export type Score = {
	/** 0 to 1; part credit only where the kind states its rule on the face. */
	points: number;
	right: boolean;
	/** What was right or wrong, in a sentence or two; first the step where it went wrong. */
	explain: string;
};

/** The right answer in words, for the page after the response. */
export type Answer = { words: string; optionIds?: string[]; order?: string[] };

/**
 * A kind of question. Everything is a pure function of the body (a published revision), the seed
 * (stored with the sitting, never sent) and the data sheet's revision, so that what was asked and
 * what was expected can be computed again for ever.
 *
 * `face` is all that the browser gets. Nothing in it may give the key away: option ids are opaque
 * and drawn per sitting, the order is shuffled, and a property test searches every face.
 *
 * Methods, not function properties: that lets a registry hold kinds of different bodies.
 */
export interface Kind<Body, Drawn, Face, Response> {
	/** What an author writes under `body:`. */
	schema: z.ZodType<Body>;
	responseSchema: z.ZodType<Response>;
	/** The data-sheet keys that the body stands on; publishing a sheet without one is refused. */
	sheetKeys(body: Body): string[];
	draw(body: Body, seed: string, sheet: SheetFigures): Outcome<Drawn>;
	face(body: Body, drawn: Drawn): Face;
	score(body: Body, drawn: Drawn, response: Response): Score;
	answer(body: Body, drawn: Drawn): Answer;
	/** The response as a person would say it, for the page after handing in. */
	said(body: Body, drawn: Drawn, response: Response): string;
	working(body: Body, drawn: Drawn): Step[];
	/** An empty response counts as left out, not as wrong, and says so in the statistics. */
	emptyIsOmitted(response: Response): boolean;
}

export type AnyKind = Kind<unknown, unknown, unknown, unknown>;
