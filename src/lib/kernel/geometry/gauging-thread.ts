import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

/** A mark of the pack's scale: as wide as this, it says this clearance. */
export type ScaleMark = { widthMm: number; clearanceMm: number };
export type ThreadReading = { leastMm: number; mostMm: number; meanMm: number; taperMm: number };

/**
 * Oil clearance from a flattened gauging thread, read at several places on the scale of its own pack.
 *
 * Formula: least, most and mean of the values read; taper = most − least.
 * @param readMm the clearances that the scale says along the thread, mm, at least one
 * @returns mm
 * Source: method of the thread's pack and of US Army manuals (compare the widest place with the scale).
 * @example threadClearance([0.038, 0.051]) // mean 0.0445, taper 0.013
 */
export function threadClearance(readMm: readonly number[]): Outcome<ThreadReading> {
	if (readMm.length === 0) return cannot('no place of the thread is read yet');
	if (readMm.some((one) => !(one > 0) || one > 1))
		return cannot('a clearance on the scale is above zero and below a millimetre');
	const [least, most] = [Math.min(...readMm), Math.max(...readMm)];
	const mean = readMm.reduce((sum, one) => sum + one, 0) / readMm.length;
	return computed({
		leastMm: least,
		mostMm: most,
		meanMm: tidy(mean),
		taperMm: tidy(most - least)
	});
}

/**
 * Clearance for a measured width between two marks of a pack's scale; the wider, the less.
 *
 * Formula: straight line between the two marks that the width lies between.
 * @param scale marks of that very pack, at least two @param widthMm flattened width, mm
 * @returns mm; "cannot" outside the scale: no thread is read beyond its pack
 * Source: the scale of the pack; the straight line between marks is common practice, no source.
 * @example onScaleMm([{ widthMm: 2, clearanceMm: 0.05 }, { widthMm: 3, clearanceMm: 0.03 }], 2.5) // 0.04
 */
export function onScaleMm(scale: readonly ScaleMark[], widthMm: number): Outcome<number> {
	if (scale.length < 2) return cannot('a scale has at least two marks');
	if (scale.some(({ widthMm: w, clearanceMm: c }) => !(w > 0) || !(c > 0) || !(w + c < 1e4)))
		return cannot('each mark has a width and a clearance above zero');
	const marks = scale.toSorted((a, b) => a.widthMm - b.widthMm);
	if (marks.some((one, at) => at > 0 && one.clearanceMm >= (marks[at - 1]?.clearanceMm ?? 0)))
		return cannot('a wider mark says a smaller clearance: look at the scale again');
	const around = marksAround(marks, widthMm);
	if (!around) return cannot('the width lies beyond the scale: use a thread of another range');
	const [low, high] = around;
	const share = high === low ? 0 : (widthMm - low.widthMm) / (high.widthMm - low.widthMm);
	return computed(tidy(low.clearanceMm + share * (high.clearanceMm - low.clearanceMm)));
}

/** The two marks that a width lies between, twice the first where it is as wide; none beyond the scale. */
export function marksAround(
	scale: readonly ScaleMark[],
	widthMm: number
): readonly [low: ScaleMark, high: ScaleMark] | undefined {
	const marks = scale.toSorted((a, b) => a.widthMm - b.widthMm);
	const after = marks.findIndex((one) => one.widthMm >= widthMm);
	const high = marks[after];
	if (!high) return undefined;
	const low = high.widthMm === widthMm ? high : marks[after - 1];
	return low && [low, high];
}
