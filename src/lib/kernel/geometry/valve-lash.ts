import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

/** The sizes in which shims are sold, mm. */
export type ShimSizes = { fromMm: number; toMm: number; stepMm: number };

/**
 * The shim that brings a measured lash to the wanted one: what is too much lash the shim must fill.
 *
 * Formula: N = T + (A − V).
 * @param fittedMm shim fitted now, T, mm @param lashMm lash measured, A, mm
 * @param wantedMm lash wanted, V, mm
 * @returns mm
 * Source: the rule of makers' shop manuals for shims over or under a bucket tappet.
 * @example shimForLashMm(2.95, 0.35, 0.2) // 3.10
 */
export function shimForLashMm(fittedMm: number, lashMm: number, wantedMm: number): Outcome<number> {
	if (!(fittedMm > 0) || !(wantedMm >= 0))
		return cannot('a shim is above zero, a wanted lash is zero or more');
	if (!(lashMm > 0)) return cannot(noGap);
	const shim = tidy(fittedMm + (lashMm - wantedMm));
	return shim > 0 ? computedNumber(shim) : cannot('no shim is thin enough for that lash');
}

/** A lash of nothing hides how far the valve is held open. */
export const noGap =
	'a valve without lash cannot be reckoned from: fit a thinner shim, turn the cam and measure again';

/**
 * The sold size nearest to a wanted shim; the thinner of two that lie as near, since a valve with
 * a little much lash ticks and one with too little burns.
 *
 * Formula: from + step · round((wanted − from) / step).
 * @param wantedMm mm @param sizes mm
 * @returns mm; "cannot" where the wanted shim lies more than half a step beyond what is sold
 * Source: rounding to the step; common practice, no source.
 * @example nearestShimMm(2.733, { fromMm: 2, toMm: 3, stepMm: 0.05 }) // 2.75
 */
export function nearestShimMm(wantedMm: number, sizes: ShimSizes): Outcome<number> {
	const count = shimCount(sizes);
	if (!count.ok) return count;
	if (!(Math.abs(wantedMm) < 1e4)) return cannot('a shim is a number in millimetres');
	const { fromMm, stepMm } = sizes;
	// A hair below the half keeps ties, and their binary dust, with the thinner one.
	const step = Math.ceil((wantedMm - fromMm) / stepMm - 0.5 - 1e-6);
	if (step < 0 || step >= count.value) return cannot('no shim of that size is sold in these steps');
	return computed(tidy(fromMm + step * stepMm));
}

/**
 * How many sizes a series of shims has.
 *
 * Formula: n = (to − from) / step + 1.
 * @param sizes mm, to no less than from, step at least 0.001
 * @returns a count; "cannot" where the last size is no whole number of steps from the first
 * Source: makers' shop manuals (2.00 to 2.98 mm by 0.02 mm: 50 sizes).
 * @example shimCount({ fromMm: 2, toMm: 2.98, stepMm: 0.02 }) // 50
 */
export function shimCount({ fromMm, toMm, stepMm }: ShimSizes): Outcome<number> {
	if (!(fromMm > 0 && toMm >= fromMm && toMm <= 100))
		return cannot('shims are sold from a size above zero up to one as large or larger');
	if (!(stepMm >= 0.001 && stepMm <= 100))
		return cannot('a step between sizes is at least 0.001 mm');
	const steps = (toMm - fromMm) / stepMm;
	if (Math.abs(steps - Math.round(steps)) > 1e-6)
		return cannot('the largest size is no whole number of steps from the smallest');
	return computed(Math.round(steps) + 1);
}

/**
 * How far an adjusting screw is turned for a change of lash at the screw.
 *
 * Formula: α = 360° · d / P.
 * @param changeMm change of lash, mm, zero or more @param pitchMm mm a turn
 * @returns degrees
 * Source: definition of pitch, ISO 5408.
 * @example screwTurnDeg(0.05, 1) // 18
 */
export function screwTurnDeg(changeMm: number, pitchMm: number): Outcome<number> {
	if (!(changeMm >= 0) || !(pitchMm > 0 && pitchMm <= 100))
		return cannot('a change of lash is zero or more, a pitch above zero');
	return computedNumber((360 * changeMm) / pitchMm);
}

/**
 * Lash at the valve from the gap at the push rod's side of a rocker.
 *
 * Formula: valve = gap · ratio.
 * @param gapMm at the push rod, mm, zero or more @param ratio of the rocker's arms, valve over rod
 * @returns mm
 * Source: law of the lever.
 * @example lashAtValveMm(0.2, 1.5) // 0.30
 */
export function lashAtValveMm(gapMm: number, ratio: number): Outcome<number> {
	if (!(gapMm >= 0) || !(ratio > 0))
		return cannot('a gap is zero or more, a rocker ratio above zero');
	return computedNumber(gapMm * ratio);
}
