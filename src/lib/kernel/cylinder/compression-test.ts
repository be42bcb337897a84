import { cannot, computed, type Outcome } from '../outcome';

/** Published rules for judging a set of compression readings against each other. */
export const balanceRules = {
	'75-of-highest': {
		words: 'lowest at least 75 % of the highest',
		source: 'US Army TM 5-4210-230-14&P addendum 2'
	},
	'70-of-highest': {
		words: 'lowest at least 70 % of the highest',
		source: 'a maker’s printed rule (maker not named)'
	},
	'80-of-mean': {
		words: 'none more than 20 % under the mean',
		source: 'US Army TM 1-1500-204-23-1'
	},
	'10-psi-apart': {
		words: 'no more than 10 psi (0.69 bar) apart',
		source: 'US Army TM 10-3930-618-20, para 2-12'
	},
	'100-psi-apart': {
		words: 'diesel: no more than 100 psi (6.9 bar) apart',
		source: 'US Army TM 5-2420-230-24-2, p. 14-22'
	}
} as const;
export type BalanceRule = keyof typeof balanceRules;

/** One pound-force a square inch in bar. */
const psiBar = (0.45359237 * 9.80665) / 25.4 ** 2 / 0.1;

export type Balance = {
	/** The least that the rule allows for this set, in the unit of the readings, bar. */
	allowedBar: number;
	/** Lowest as a share of the highest. */
	lowestShare: number;
	/** Cylinders below it, counted from 1. */
	low: number[];
	/** Two low ones side by side: the gasket between them is looked at first. */
	neighbours: [number, number][];
};

/**
 * Judges the readings of a compression test against each other by a named rule.
 *
 * Formula: 0.75 · highest; 0.70 · highest; 0.80 · mean; highest − 10 psi; highest − 100 psi.
 * @param readBar highest gauge reading of each cylinder, bar, at least two, above zero
 * @param rule which published rule; a maker's own limits win over all of them
 * @returns the least allowed (bar), lowest over highest, the low cylinders and low neighbours
 * Source: as named beside each rule in `balanceRules`.
 * @example compressionBalance([10.3, 10, 10.2, 7.4], '75-of-highest') // cylinder 4 is low
 */
export function compressionBalance(
	readBar: readonly number[],
	rule: BalanceRule
): Outcome<Balance> {
	if (readBar.length < 2) return cannot('a set to compare has at least two cylinders');
	if (readBar.some((one) => !(one > 0) || one > 200))
		return cannot('a compression reading is above zero and below 200 bar');
	const highest = Math.max(...readBar);
	const mean = readBar.reduce((sum, one) => sum + one, 0) / readBar.length;
	const allowedBar = {
		'75-of-highest': 0.75 * highest,
		'70-of-highest': 0.7 * highest,
		'80-of-mean': 0.8 * mean,
		'10-psi-apart': highest - 10 * psiBar,
		'100-psi-apart': highest - 100 * psiBar
	}[rule];
	const low = readBar.flatMap((one, at) => (one < allowedBar - 1e-9 ? [at + 1] : []));
	return computed({
		allowedBar,
		lowestShare: Math.min(...readBar) / highest,
		low,
		neighbours: low
			.filter((one) => low.includes(one + 1))
			.map((one): [number, number] => [one, one + 1])
	});
}

export type WetVerdict = 'rings' | 'valves-or-gasket' | 'unclear';

/**
 * What a spoonful of oil says of a low cylinder.
 *
 * Formula: rise = (wet − dry) / dry; rings where it is clear, valves or gasket where there is none.
 * @param dryBar, wetBar readings before and after about a tablespoon of oil, bar
 * @returns the rise as a share and what it points to; a rise between 5 and 15 % is unclear
 * Source: US Army TM 5-4210-230-14&P addendum 2, step 7; the shares that count as "clear" and
 *   "none" are common practice, no source.
 * @example wetTest(7.4, 9.5) // a rise of 28 %: rings, piston or bore
 */
export function wetTest(
	dryBar: number,
	wetBar: number
): Outcome<{ rise: number; verdict: WetVerdict }> {
	if (!(dryBar > 0) || !(wetBar > 0) || dryBar > 200 || wetBar > 200)
		return cannot('both readings are above zero and below 200 bar');
	const rise = (wetBar - dryBar) / dryBar;
	return Number.isFinite(rise)
		? computed({
				rise,
				verdict: rise >= 0.15 ? 'rings' : rise <= 0.05 ? 'valves-or-gasket' : 'unclear'
			})
		: cannot('the readings are out of all proportion');
}
