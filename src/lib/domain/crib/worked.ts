import type { Ruling, RulingQuestion } from '$lib/kernel/measurement/ruling';
import type { Step } from '../working';
import type { Drawing } from './drawing';

/** A result with its unit; the page shows it in the other system too. */
export type FigureLine = {
	key: string;
	words: string;
	value: number;
	/** The metric unit, as printed: mm, N·m, kN, bar, cm³, °, °C, or '' for a bare ratio. */
	unit: string;
	decimals: number;
	/** The line that the page was opened for stands large. */
	main?: boolean;
};
/** A result in words: an order, a size to buy, a verdict. */
export type WordsLine = { key: string; words: string; text: string; main?: boolean };
export type ResultLine = FigureLine | WordsLine;

/** A reading held against its limits, for the limit scale and the sentence beneath it. */
export type RuledReading = {
	of: string;
	question: RulingQuestion;
	value: number;
	expandedUncertainty: number;
	unit: string;
	decimals: number;
	least?: number;
	most?: number;
	ruling: Ruling;
};

/** What a calculator gives back: results, the working that led to them, and what is drawn. */
export type Worked = {
	lines: ResultLine[];
	working: Step[];
	drawing?: Drawing;
	rulings?: RuledReading[];
	/** What a person should know about this very result, such as "single use". */
	notes?: string[];
};

export function isFigure(line: ResultLine): line is FigureLine {
	return 'value' in line;
}
