import { cannot, computed, type Outcome } from '../outcome';
import { cheapestAssignment } from './assignment';
import { tidy } from './diameter-grid';
import { faultIn, middleMm, spaceMm, type ShimmedValve } from './shimmed-valve';
import { impossible, shimCosts, soldFor } from './shim-costs';
import { shimCount, type ShimSizes } from './valve-lash';

export type ShimChoice = {
	valve: string;
	shimMm: number;
	/** Where the shim comes from: it stays, from another valve, from the box, or bought. */
	from: 'stays' | 'valve' | 'box' | 'bought';
	/** The valve that gives it. */
	giver?: string;
	lashMm: number;
	/** Off the middle of the limits. */
	offMm: number;
};
export type ShimPlan = {
	choices: ShimChoice[];
	/** Sizes to buy, with how many of each. */
	buy: { sizeMm: number; count: number }[];
	bought: number;
	totalOffMm: number;
	/** What is left of the fitted shims and of the box, mm. */
	spareMm: number[];
};

/**
 * Which shim goes to which valve, from the fitted ones and a box of loose ones, so that every lash
 * ends within its limits: with the fewest shims bought, then the smallest sum of departures from
 * the middle of the limits, then the fewest shims moved. Exact, as an assignment problem.
 *
 * Formula: lash = A + T − N of the shim N that goes in.
 * @param valves mm, up to 64; each lash above zero @param boxMm loose shims, mm
 * @param sizes in which new ones are sold, mm @param within whether a valve whose lash is right as
 * found keeps its shim, or may give it away for a better sum
 * @returns the plan; "cannot" names the valves that no shim brings within their limits
 * Source: the shop rule N = T + (A − V); H. W. Kuhn (1955) for the choice.
 * @example shimPlan([{ name: '1', shimMm: 2.5, lashMm: 0.3, leastMm: 0.18, mostMm: 0.22 }], [],
 *   { fromMm: 2, toMm: 3, stepMm: 0.05 }) // one to buy, 2.60
 */
export function shimPlan(
	valves: readonly ShimmedValve[],
	boxMm: readonly number[],
	sizes: ShimSizes,
	within: 'may-move' | 'stays' = 'may-move'
): Outcome<ShimPlan> {
	const fault = faultIn(valves, boxMm);
	if (fault) return cannot(fault);
	const count = shimCount(sizes);
	if (!count.ok) return count;
	const hand = [...valves.map((one) => one.shimMm), ...boxMm];
	const sold = valves.map((valve) => soldFor(valve, sizes));
	const costs = shimCosts(valves, hand, sold, within);
	const taken = cheapestAssignment(costs);
	const left = valves.filter((_, row) => (costs[row]?.[taken[row] ?? 0] ?? 0) >= impossible);
	if (left.length > 0) return cannot(notServed(left.map((one) => one.name)));
	const choices = valves.map((valve, row): ShimChoice => {
		const at = taken[row] ?? 0;
		const giver = at === row ? undefined : valves[at]?.name;
		const shimMm = hand[at] ?? sold[row] ?? 0;
		const lashMm = tidy(spaceMm(valve) - shimMm);
		return {
			valve: valve.name,
			shimMm,
			from: at === row ? 'stays' : giver ? 'valve' : at < hand.length ? 'box' : 'bought',
			...(giver ? { giver } : {}),
			lashMm,
			// Nothing off is 0, not the −0 that rounding may leave.
			offMm: tidy(lashMm - middleMm(valve)) + 0
		};
	});
	const spareMm = hand.filter((_, at) => !taken.includes(at)).toSorted((a, b) => a - b);
	return computed({ ...boughtIn(choices), choices, spareMm });
}

function notServed(names: readonly string[]): string {
	return `no shim at hand and none that is sold brings ${names.join(', ')} within limits: measure again, then look at seat, stem and cam`;
}

function boughtIn(choices: readonly ShimChoice[]) {
	const bought = choices.filter((one) => one.from === 'bought').map((one) => one.shimMm);
	return {
		buy: [...new Set(bought)]
			.sort((a, b) => a - b)
			.map((sizeMm) => ({ sizeMm, count: bought.filter((one) => one === sizeMm).length })),
		bought: bought.length,
		totalOffMm: tidy(choices.reduce((sum, one) => sum + Math.abs(one.offMm), 0))
	};
}
