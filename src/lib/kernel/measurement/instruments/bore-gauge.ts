import { computedNumber } from '../../computed-number';
import { cannot, computed, type Outcome } from '../../outcome';

/**
 * Bore by a dial bore gauge set to zero in a setting ring or between a micrometer's faces.
 *
 * Formula: bore = setting + where the needle turns back, larger counted positive.
 * @param setting size at which it was zeroed, above zero @param beyond from zero to where the
 * needle turns back as the gauge is rocked along the bore; below zero where the bore is smaller
 * @returns in their unit; "cannot" where no bore is left
 * Source: definition. Which way the needle moves for a smaller hole depends on the gauge: on many
 * clockwise means smaller, and the setting ring tells.
 * @example boreByDial(86, 0.035) // 86.035
 */
export function boreByDial(setting: number, beyond: number): Outcome<number> {
	if (!(setting > 0)) return cannot('a setting is a size above zero');
	const bore = computedNumber(setting + beyond);
	return bore.ok && bore.value <= 0 ? cannot('no bore is left: look at the sign') : bore;
}

/**
 * The reading of a bore from what the needle showed while the gauge was rocked: the least, since
 * tilted it spans more.
 * @param shown at several tilts, in one unit
 * @example whereNeedleTurns([0.041, 0.036, 0.035, 0.038]) // 0.035
 */
export function whereNeedleTurns(shown: readonly number[]): Outcome<number> {
	if (shown.length === 0) return cannot('no reading is taken yet');
	return shown.every(Number.isFinite)
		? computed(Math.min(...shown))
		: cannot('a reading is no number');
}
