import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import { guardBandOf, type GuardBandRule } from './guard-band';
import type { Limits } from './ruling';

/** The usual least ratio, and the old rule of ten. */
export const usualRatio = 4;
export const easyRatio = 10;

export type ToolVerdict = 'easily' | 'yes' | 'in-part' | 'no';
export type ToolJudgement = {
	verdict: ToolVerdict;
	/** Test uncertainty ratio. */
	ratio: number;
	guardBand: number;
	/** Readings between which it cannot decide, one pair a limit. */
	undecided: { from: number; to: number }[];
	/** Part of the limits' width, 0 to 1, in which it can call nothing within. */
	share: number;
};

/** One limit alone has no width; then `room` is how far inside it a sound part lies. */
export type Asked = Limits & { room?: number; rule?: GuardBandRule };

/**
 * Whether an instrument can judge by these limits at all, asked before measuring.
 *
 * Formula: ratio = (most − least) / (2 U), for one limit room / U; undecided from limit − g to
 * limit + g.
 * @param expanded U of a reading with this instrument, k = 2, above zero @param asked limits, for a
 * single one the room, and the rule for g
 * @returns "easily" from 10, "yes" from 4, "in-part" while some readings could still be called
 * within, "no" where none could; "cannot" where a figure is missing or none
 * Source: ANSI/NCSL Z540.3-2006 (ratio of the span to twice U, 4:1); the rule of ten is older trade
 * practice; ISO 14253-1 for the zone.
 * @example judgeTool(0.002, { least: 39.984, most: 40 }) // yes, ratio 4
 */
export function judgeTool(expanded: number, asked: Asked): Outcome<ToolJudgement> {
	const { least, most, rule = 'full-U' } = asked;
	if (!(expanded > 0) || !Number.isFinite(expanded))
		return cannot('the uncertainty of a tool is a number above zero');
	const limits = [least, most].filter((one) => one !== undefined);
	if (limits.length === 0) return cannot('there is no limit to judge by');
	if (!limits.every(Number.isFinite)) return cannot('a limit is no number');
	const half = halfWidth(asked);
	if (!half.ok) return half;
	const guardBand = guardBandOf(rule, expanded);
	const ratio = half.value / expanded;
	if (!Number.isFinite(ratio)) return cannot('the room is no number');
	const share = Math.min(1, guardBand / half.value);
	return computed({
		verdict: reached(ratio, easyRatio)
			? 'easily'
			: reached(ratio, usualRatio)
				? 'yes'
				: share < 1
					? 'in-part'
					: 'no',
		ratio,
		guardBand,
		undecided: limits.map((limit) => ({ from: limit - guardBand, to: limit + guardBand })),
		share
	});
}

/**
 * The largest expanded uncertainty with which a tool still judges by these limits.
 *
 * Formula: U = (most − least) / (2 · ratio), for one limit room / ratio.
 * @param asked limits, for a single one the room @param ratio wanted, above zero
 * @returns in the limits' unit; "cannot" as judgeTool
 * Source: ANSI/NCSL Z540.3-2006 (4:1), solved for U.
 * @example expandedFor({ least: 39.984, most: 40 }) // 0.002
 */
export function expandedFor(asked: Asked, ratio = usualRatio): Outcome<number> {
	const half = halfWidth(asked);
	if (!half.ok) return half;
	return ratio > 0 ? computedNumber(half.value / ratio) : cannot('a ratio is above zero');
}

function halfWidth({ least, most, room }: Asked): Outcome<number> {
	if (least !== undefined && most !== undefined)
		return most > least
			? computed((most - least) / 2)
			: cannot('the least limit lies above the most, or on it');
	if (room === undefined)
		return cannot('one limit alone has no width: say how far inside it a sound part lies');
	return room > 0 ? computed(room) : cannot('a sound part lies inside its limit');
}

/** A ratio of 4 that came out as 3.9999999999 is 4. */
function reached(ratio: number, wanted: number): boolean {
	return ratio >= wanted * (1 - 1e-9);
}
