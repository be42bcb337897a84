import {
	leastMm,
	outOfRoundMm,
	taperMm,
	type DiameterGrid
} from '$lib/kernel/geometry/diameter-grid';
import { oilClearance } from '$lib/kernel/geometry/oil-clearance';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { ruleReading, type Ruling } from '$lib/kernel/measurement/ruling';
import {
	expandedMm,
	ofDifferenceMm,
	standardUncertaintyMm
} from '$lib/kernel/measurement/uncertainty';
import type { DataSheet } from '../data-sheets/schema';
import { dimensionOf, limitsFor } from '../data-sheets/value-of';
import type { JobSheet, ReadingGrid, ResultWanted } from './schema';
import type { SubmissionBody } from './submission';

export type ComputedResult = {
	key: string;
	title: string;
	valueMm: number;
	expandedMm: number;
	decimals: number;
	build?: { least: number; most: number };
	runAgain?: { least?: number; most?: number };
	ruling: Ruling;
};
export type ResultLine = { key: string; title: string } & (
	{ ok: true; result: ComputedResult } | { ok: false; because: string }
);

/**
 * What follows from the readings: the same function in the browser as they are typed, and on the
 * server when they are handed in and marked.
 */
export function resultsOf(
	jobSheet: Pick<JobSheet, 'grids' | 'results' | 'ruledFor'>,
	sheet: DataSheet,
	readings: SubmissionBody['readings']
): ResultLine[] {
	return jobSheet.results.map((wanted): ResultLine => {
		const { key, title } = wanted;
		const made = resultOf(jobSheet, sheet, readings, wanted);
		return made.ok
			? { key, title, ok: true, result: made.value }
			: { key, title, ok: false, because: made.because };
	});
}

function resultOf(
	jobSheet: Pick<JobSheet, 'grids' | 'ruledFor'>,
	sheet: DataSheet,
	readings: SubmissionBody['readings'],
	wanted: ResultWanted
): Outcome<ComputedResult> {
	const dimension = dimensionOf(sheet, wanted.limit);
	if (!dimension) return cannot(`the data sheet has no ${wanted.limit}`);
	const value = valueOf(jobSheet, readings, wanted);
	if (!value.ok) return value;
	const { valueMm, standardMm } = value.value;
	const expanded = expandedMm(standardMm);
	const ruling = ruleReading({
		question: jobSheet.ruledFor,
		value: valueMm,
		expandedUncertainty: expanded,
		...limitsFor(dimension, jobSheet.ruledFor)
	});
	if (!ruling.ok) return ruling;
	return computed({
		key: wanted.key,
		title: wanted.title,
		valueMm,
		expandedMm: expanded,
		decimals: dimension.decimals,
		build: dimension.build,
		runAgain: dimension.runAgain,
		ruling: ruling.value
	});
}

type Measured = { valueMm: number; standardMm: number };

function valueOf(
	jobSheet: Pick<JobSheet, 'grids'>,
	readings: SubmissionBody['readings'],
	wanted: ResultWanted
): Outcome<Measured> {
	const gridOf = (key: string) => jobSheet.grids.find((one) => one.key === key);
	const taken = (key: string): DiameterGrid => readings[key] ?? [];
	if (wanted.sum === 'oil-clearance') {
		const [bore, pin] = [gridOf(wanted.bore), gridOf(wanted.pin)];
		if (!bore || !pin) return cannot('its readings are not on this job sheet');
		const clearance = oilClearance(taken(wanted.bore), taken(wanted.pin));
		// The most is what runs out of oil first; it is the one that is ruled to run again.
		return clearance.ok
			? computed({
					valueMm: clearance.value.mostMm,
					standardMm: ofDifferenceMm(standardOf(bore), standardOf(pin))
				})
			: clearance;
	}
	const grid = gridOf(wanted.grid);
	if (!grid) return cannot('its readings are not on this job sheet');
	const sums = { 'out-of-round': outOfRoundMm, taper: taperMm, 'least-diameter': leastMm };
	const sum = sums[wanted.sum](taken(wanted.grid));
	if (!sum.ok) return sum;
	const one = standardOf(grid);
	// A difference of two readings of one instrument carries the uncertainty of both.
	const standardMm = wanted.sum === 'least-diameter' ? one : ofDifferenceMm(one, one);
	return computed({ valueMm: sum.value, standardMm });
}

function standardOf({ instrument }: ReadingGrid): number {
	return standardUncertaintyMm(instrument.leastCountMm, instrument.calibrationExpandedMm);
}

/** Readings outside what is plausible: named before they are handed in, never changed. */
export function slips(
	grids: readonly ReadingGrid[],
	readings: SubmissionBody['readings']
): string[] {
	return grids.flatMap((grid) =>
		(readings[grid.key] ?? []).flatMap((row, r) =>
			row.flatMap((value, c) =>
				value !== null && (value < grid.plausible.leastMm || value > grid.plausible.mostMm)
					? [
							`${grid.title}, ${grid.rows[r]}, ${grid.columns[c]}: ${value} mm looks like a slip of the pen.`
						]
					: []
			)
		)
	);
}
