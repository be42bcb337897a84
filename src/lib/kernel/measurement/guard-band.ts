import { coverageFactor } from './uncertainty';

/** Φ of this is 0.95. Written out, so that a page that only rules loads no distributions. */
const oneSided95 = 1.6448536269514722;

/** The rules for a guard band that a ruling can go by; the first is the house's. */
export const guardBandRules = {
	'full-U': { words: 'its uncertainty', says: 'g = U, the full expanded uncertainty (k = 2)' },
	'one-sided-95': {
		words: '1.645 times its standard uncertainty',
		says: 'g = 1.645 u, 95 % sure on one side'
	}
} as const;
export type GuardBandRule = keyof typeof guardBandRules;

/**
 * Guard band: how far inside a limit a reading must lie to be called within.
 *
 * Formula: g = U for the full-U rule; g = 1.645 U / 2 for the one-sided 95 % rule.
 * @param rule which of the two @param expanded U with k = 2, zero or more
 * @returns in the unit of U
 * @throws RangeError on misuse
 * Source: ISO 14253-1:2013 (g = U); ISO 14253-1:2017 and JCGM 106:2012, 8.3.2 (95 %).
 * @example guardBandOf('one-sided-95', 0.005) // 0.00411
 */
export function guardBandOf(rule: GuardBandRule, expanded: number): number {
	if (!(expanded >= 0) || !Number.isFinite(expanded))
		throw new RangeError('an uncertainty is a number, zero or more');
	return rule === 'full-U' ? expanded : (oneSided95 * expanded) / coverageFactor;
}
