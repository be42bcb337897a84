import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

/**
 * How far a part has worn beyond its printed size: a bore grows, a journal shrinks.
 *
 * Formula: bore, measured − printed; journal, printed − measured; nothing below zero.
 * @param worstMm worst reading (largest of a bore, smallest of a journal), mm
 * @param printedMm the printed limit on that side, mm
 * @returns mm; zero while the part lies within what is printed
 * Source: definition; bore wear above standard as in US Army TM 5-3805-262-34, p. 4-24.
 * @example wearMm('bore', 74.052, 74.01) // 0.042
 */
export function wearMm(
	part: 'bore' | 'journal',
	worstMm: number,
	printedMm: number
): Outcome<number> {
	if (!(worstMm > 0) || !(printedMm > 0)) return cannot('a diameter is a number above zero');
	const beyond = part === 'bore' ? worstMm - printedMm : printedMm - worstMm;
	return computedNumber(Math.max(0, tidy(beyond)));
}
