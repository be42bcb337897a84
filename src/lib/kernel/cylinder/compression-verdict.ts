import { cannot, computed, type Outcome } from '../outcome';
import { compressionBalance, type Balance, type BalanceRule } from './compression-test';
import { wetTest, type WetVerdict } from './wet-test';

/** The same number of strokes for every reading; wet is after about a tablespoon of oil. */
export type CompressionReading = { dryBar: number; wetBar?: number };
export type CylinderVerdict = {
	/** Counted from 1. */
	cylinder: number;
	ruling: 'within' | 'low';
	/** Of the highest in the set. */
	share: number;
	wet?: { rise: number; verdict: WetVerdict };
	/** A low neighbour, between which and this one the gasket is looked at first. */
	neighbour?: number;
	/** What to do; nothing where nothing follows. */
	next?: string;
};

/**
 * What a compression test says of each cylinder, and what to do next.
 *
 * @param readings of every cylinder in their order, bar
 * @param rule which published rule @param leastBar the engine's own least, bar, where it is known
 * @returns the balance of the set and a verdict for each; "cannot" names the cylinder at fault
 * @example compressionVerdicts([{ dryBar: 10.3 }, { dryBar: 7.4, wetBar: 9.5 }], '75-of-highest')
 *   // cylinder 2 is low and rises by 28 %: rings, piston or bore
 */
export function compressionVerdicts(
	readings: readonly CompressionReading[],
	rule: BalanceRule,
	leastBar?: number
): Outcome<{ balance: Balance; cylinders: CylinderVerdict[] }> {
	const balance = compressionBalance(
		readings.map((one) => one.dryBar),
		rule,
		leastBar
	);
	if (!balance.ok) return balance;
	const { low, neighbours } = balance.value;
	const highest = Math.max(...readings.map((one) => one.dryBar));
	const cylinders: CylinderVerdict[] = [];
	for (const [at, { dryBar, wetBar }] of readings.entries()) {
		const cylinder = at + 1;
		const found: CylinderVerdict = {
			cylinder,
			ruling: low.includes(cylinder) ? 'low' : 'within',
			share: dryBar / highest
		};
		if (wetBar !== undefined) {
			const wet = wetTest(dryBar, wetBar);
			if (!wet.ok) return cannot(`cylinder ${cylinder}: ${wet.because}`);
			found.wet = wet.value;
		}
		const pair = neighbours.find((both) => both.includes(cylinder));
		if (pair) found.neighbour = pair[0] === cylinder ? pair[1] : pair[0];
		if (found.ruling === 'low') found.next = nextFor(found, dryBar, rule);
		cylinders.push(found);
	}
	return computed({ balance: balance.value, cylinders });
}

/** A spoonful fills half of what a diesel leaves above its piston: its wet reading says nothing of the rings. */
const noOil: readonly BalanceRule[] = ['100-psi-apart'];

function nextFor({ wet, neighbour }: CylinderVerdict, dryBar: number, rule: BalanceRule): string {
	const verdict = wet?.verdict;
	if (verdict === 'rings')
		return 'Rings, piston or bore: put the same oil into a sound cylinder first, since oil takes up room of its own. If the low one rises by more, measure its bore and ring gaps.';
	if (verdict === 'unclear')
		return 'The oil shows neither. Hold it under air at top dead centre and listen where it comes out.';
	if (neighbour !== undefined)
		return `Low beside cylinder ${neighbour}: look at the gasket between the two first.`;
	if (verdict === 'valves-or-gasket')
		return 'No rise with oil: check its valve lash, then hold it under air and listen at inlet, exhaust and radiator.';
	if (dryBar === 0 || noOil.includes(rule))
		return 'Hold it under air at top dead centre and listen where it comes out.';
	return 'Read it again with the same number of strokes. Still low: about a tablespoon of oil by the plug hole, and once more.';
}
