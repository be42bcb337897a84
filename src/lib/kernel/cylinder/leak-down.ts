import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';

/**
 * Leakage of a cylinder held under air at top dead centre.
 *
 * Formula: leak = 100 % · (p − c) / p.
 * @param inputBar p, regulator gauge @param cylinderBar c, cylinder gauge, the same unit, 0 to p
 * @returns per cent
 * Source: definition of the differential test, FAA AC 43.13-1B, para 8-14; reference entry C12.
 * @example leakPercent(80, 66) // 17.5
 */
export function leakPercent(inputBar: number, cylinderBar: number): Outcome<number> {
	if (!(inputBar > 0)) return cannot('the regulator’s gauge stands above zero');
	if (!(cylinderBar >= 0) || cylinderBar > inputBar)
		return cannot('the cylinder’s gauge stands between zero and the regulator’s');
	return computedNumber((100 * (inputBar - cylinderBar)) / inputBar);
}

/** The differential test's line: a quarter of what is given (FAA AC 43.13-1B, para 8-14; reference C10). */
export const suspectAbovePercent = 25;

/** Bands of the trade for ordinary engines, no source; a maker's own limits win. */
export const leakBands = [
	{ upto: 10, words: 'good' },
	{ upto: 20, words: 'worn, serviceable' },
	{ upto: 30, words: 'needs work' },
	{ upto: 100, words: 'far gone: strip it' }
] as const;

/**
 * What a leakage is called in the trade, and whether the aircraft rule would call it suspect.
 *
 * Formula: suspect where the cylinder holds less than 75 % of what it is given (60 of 80 psi).
 * @param percent leakage, 0 to 100
 * @returns the band in words and the suspicion
 * Source: bands trade-wide, no source (reference C16); FAA AC 43.13-1B, para 8-14 (reference C10).
 * @example leakBand(17.5) // worn, serviceable; not suspect
 */
export function leakBand(percent: number): Outcome<{ words: string; suspect: boolean }> {
	const band = leakBands.find((one) => percent <= one.upto);
	if (!(percent >= 0) || !band) return cannot('a leakage lies from 0 to 100 %');
	return computed({ words: band.words, suspect: percent > suspectAbovePercent + 1e-9 });
}

/**
 * Blow-by rate from a count over some minutes.
 *
 * Formula: rate = volume · 60 / minutes.
 * @param volume in any unit of volume @param minutes above zero
 * @returns the unit an hour
 * Source: US Army TM 9-2815-255-24, para 3-6 (a five minute figure times 12).
 * @example blowByPerHour(15, 5) // 180
 */
export function blowByPerHour(volume: number, minutes: number): Outcome<number> {
	if (!(volume >= 0) || !(minutes > 0)) return cannot('a volume over a time above zero');
	return computedNumber((volume * 60) / minutes);
}

/**
 * How much lower an inlet vacuum reads at a height.
 *
 * Formula: drop = h / 1000, in inches of mercury with h in feet.
 * @param heightFt feet above the sea, zero or more, up to 15 000
 * @returns inHg
 * Source: US Army Ordnance course OD1001, lesson 3; reference entry V02.
 * @example vacuumDropInHg(5000) // 5
 */
export function vacuumDropInHg(heightFt: number): Outcome<number> {
	if (!(heightFt >= 0) || heightFt > 15_000)
		return cannot('the rule holds from the sea up to 15 000 ft');
	return computed(heightFt / 1000);
}
