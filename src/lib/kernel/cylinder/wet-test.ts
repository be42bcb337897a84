import { cannot, computed, type Outcome } from '../outcome';

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
	if (dryBar === 0)
		return cannot('a cylinder that shows nothing dry has a way open: oil says nothing of it');
	if (!(dryBar > 0) || !(wetBar >= 0) || dryBar > 200 || wetBar > 200)
		return cannot('a dry reading above zero and a wet one are wanted, both below 200 bar');
	const rise = (wetBar - dryBar) / dryBar;
	return Number.isFinite(rise)
		? computed({
				rise,
				verdict: rise >= 0.15 ? 'rings' : rise <= 0.05 ? 'valves-or-gasket' : 'unclear'
			})
		: cannot('the readings are out of all proportion');
}
