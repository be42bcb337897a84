import { cannot, computed, type Outcome } from '../outcome';

/** Published rules for judging a set of compression readings against each other. */
export const balanceRules = {
	'75-of-highest': {
		words: 'lowest at least 75 % of the highest',
		source: 'US Army TM 5-4210-230-14&P addendum 2'
	},
	'70-of-highest': {
		words: 'lowest at least 70 % of the highest, and not under 100 psi (6.9 bar)',
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
	/** What the rule asks of this set by itself, bar. */
	ruleBar: number;
	/** The least allowed: the rule's, or the engine's own least where that lies higher, bar. */
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
 * Formula: 0.75 · highest; 0.70 · highest but 100 psi at least; 0.80 · mean; highest − 10 psi; highest − 100 psi.
 * @param readBar highest gauge reading of each cylinder, bar, at least two, zero or more
 * @param rule which published rule; a maker's own limits win over all of them
 * @param leastBar the engine's own least, bar, where its data sheet states one: it rules as well
 * @returns the least allowed (bar), lowest over highest, the low cylinders and low neighbours
 * Source: as named beside each rule in `balanceRules`.
 * @example compressionBalance([10.3, 10, 10.2, 7.4], '75-of-highest') // cylinder 4 is low
 */
export function compressionBalance(
	readBar: readonly number[],
	rule: BalanceRule,
	leastBar = 0
): Outcome<Balance> {
	if (readBar.length < 2) return cannot('a set to compare has at least two cylinders');
	// A burnt valve reads nothing at all: zero is a reading, and a low one.
	if (readBar.some((one) => !(one >= 0) || one > 200))
		return cannot('a compression reading lies from 0 to 200 bar');
	if (!(leastBar >= 0) || leastBar > 200)
		return cannot('the engine’s own least lies from 0 to 200 bar');
	const highest = Math.max(...readBar);
	if (highest === 0) return cannot('no cylinder shows any pressure: look at the gauge first');
	const mean = readBar.reduce((sum, one) => sum + one, 0) / readBar.length;
	const ruleBar = {
		'75-of-highest': 0.75 * highest,
		'70-of-highest': Math.max(0.7 * highest, 100 * psiBar),
		'80-of-mean': 0.8 * mean,
		'10-psi-apart': highest - 10 * psiBar,
		'100-psi-apart': highest - 100 * psiBar
	}[rule];
	const allowedBar = Math.max(ruleBar, leastBar);
	const low = readBar.flatMap((one, at) => (one < allowedBar - 1e-9 ? [at + 1] : []));
	return computed({
		ruleBar,
		allowedBar,
		lowestShare: Math.min(...readBar) / highest,
		low,
		neighbours: low
			.filter((one) => low.includes(one + 1))
			.map((one): [number, number] => [one, one + 1])
	});
}
