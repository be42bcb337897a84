import { z } from 'zod';
import type { Limits } from '$lib/kernel/measurement/ruling';
import { cannot, computed } from '$lib/kernel/outcome';
import { ruling } from '../../crib/calculators/ruling';
import type { SheetFigure } from '../sheet-figures';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const calledWithinParameters = z.strictObject({
	/** A length with limits. */
	of: sheetKeySchema,
	purpose: z.enum(['build', 'run-again']),
	/** The edge of what may still be called within. */
	edge: z.enum(['from', 'up-to'])
});

/**
 * The last reading that may still be called within, by limits that are looked up in the data sheet
 * and an uncertainty that is given. U is a tenth to four tenths of the limits' width (for one limit
 * of the room to the build limit), a thousandth at least, and always less than half of it.
 */
export const calledWithin = sumOf({
	calculator: ruling,
	parameters: calledWithinParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of, purpose, edge }, random, sheet) {
		const found = sheet.figure(of);
		if (!found.ok) return found;
		const figure = found.value;
		if (figure.unit !== 'mm') return cannot(`${figure.words} is no length`);
		const limits = limitsOf(figure, purpose);
		const limit = edge === 'from' ? limits.least : limits.most;
		if (limit === undefined) return cannot(`${figure.words} has no such limit`);
		const width = widthOf(figure, limits);
		const expanded = Math.max(0.001, shown(width * random.between(0.1, 0.4), 3));
		if (!(2 * expanded < width)) return cannot(`the limits of ${figure.words} are too close`);
		return computed({
			values: {
				question: purpose,
				value: limit,
				expanded,
				least: limits.least,
				most: limits.most,
				rule: 'full-U' as const
			},
			ask: edge,
			given: [
				{
					words: 'Expanded uncertainty of the reading, k = 2',
					value: expanded,
					unit: 'mm',
					decimals: 3
				}
			],
			prompt: `The guard band is the full expanded uncertainty. ${edge === 'from' ? 'From which reading up' : 'Up to which reading'} may “${figure.words}” be called within, ${purpose === 'build' ? 'for a fresh build' : 'to run again'}? Its limits stand in the data sheet.`
		});
	}
});

function limitsOf(figure: SheetFigure, purpose: 'build' | 'run-again'): Limits {
	const { least, most, wearLimit, wearsBy } = figure;
	if (purpose === 'build' || wearLimit === undefined)
		return { ...(least === undefined ? {} : { least }), ...(most === undefined ? {} : { most }) };
	return wearsBy === 'growing' ? { most: wearLimit } : { least: wearLimit };
}

function widthOf(figure: SheetFigure, { least, most }: Limits): number {
	if (least !== undefined && most !== undefined) return most - least;
	const build = most === undefined ? figure.least : figure.most;
	return build === undefined ? 0 : Math.abs((most ?? least ?? build) - build);
}
