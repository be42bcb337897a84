import { computedNumber } from '../../computed-number';
import { cannot, type Outcome } from '../../outcome';
import { areLines } from './lines';

/**
 * What one line of a vernier is worth: a space of the main scale less a space of the vernier.
 *
 * Formula: δ = s − (n − 1) s / n = s / n, where n vernier spaces take up n − 1 of the main scale.
 * @param space s of the main scale, above zero @param lines n of the vernier, whole, 2 or more
 * @returns in the unit of s
 * Source: US Army TM 9-243 (ten vernier spaces equal nine of the thimble).
 * @example vernierValue(0.001, 10) // 0.0001
 */
export function vernierValue(space: number, lines: number): Outcome<number> {
	if (!(space > 0)) return cannot('a space of the scale is above zero');
	if (!Number.isSafeInteger(lines) || lines < 2) return cannot('a vernier has two lines or more');
	return computedNumber(space / lines);
}

/**
 * Reading of a metric vernier caliper.
 *
 * Formula: main scale + vernier line · least count.
 * @param mainMm whole mm passed on the main scale, 0 or more @param vernierLine that meets a line
 * @param leastCountMm of one vernier line: 0.1, 0.05 or 0.02
 * @returns mm; "cannot" where the vernier has no such line
 * Source: definition; US Army TM 9-243.
 * @example metricVernierMm(37, 23, 0.02) // 37.46
 */
export function metricVernierMm(
	mainMm: number,
	vernierLine: number,
	leastCountMm: number
): Outcome<number> {
	const last = Math.round(1 / leastCountMm);
	if (!(leastCountMm > 0) || !Number.isFinite(last)) return cannot('a least count is above zero');
	if (last < 2 || Math.abs(last * leastCountMm - 1) > 1e-9)
		return cannot('a vernier divides the millimetre into whole parts: 0.1, 0.05 or 0.02');
	if (!areLines([mainMm, 10_000], [vernierLine, last]))
		return cannot(`the main scale shows whole millimetres, the vernier lines 0 to ${last}`);
	return computedNumber(mainMm + vernierLine / last);
}

/**
 * Reading of an inch vernier caliper of 25 lines.
 *
 * Formula: inches + 0.1 · tenths + 0.025 · lines + 0.001 · vernier line.
 * @param shown inches 0 or more; tenths 0 to 9; lines past them, 0 to 3; vernierLine 0 to 25
 * @returns inches, as its scale is cut; "cannot" where a line does not exist
 * Source: US Army Ordnance course OD1642, reading a vernier caliper.
 * @example inchVernierIn({ inches: 1, tenths: 4, lines: 3, vernierLine: 11 }) // 1.486
 */
export function inchVernierIn(shown: {
	inches: number;
	tenths: number;
	lines: number;
	vernierLine: number;
}): Outcome<number> {
	const { inches, tenths, lines, vernierLine } = shown;
	if (!areLines([inches, 1000], [tenths, 9], [lines, 3], [vernierLine, 25]))
		return cannot('the scale shows tenths 0 to 9 and three lines past them, the vernier 0 to 25');
	return computedNumber((1000 * inches + 100 * tenths + 25 * lines + vernierLine) / 1000);
}
