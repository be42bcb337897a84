import { tidy } from './diameter-grid';
import { middleMm, spaceMm, type ShimmedValve } from './shimmed-valve';
import { nearestShimMm, type ShimSizes } from './valve-lash';

/**
 * A cost is one whole number: nothing that fits, then shims bought, then tenths of a micrometre off
 * the middle, then shims moved. Each counts for more than all of the next together.
 */
const moved = 1;
const tenthOfMicrometre = 2 ** 7;
const purchase = 2 ** 31;
/** No lash within limits: a cost of this or more. */
export const impossible = 2 ** 38;

/**
 * What it costs to give each valve each shim: those at hand, the fitted ones first in the valves'
 * order, then for each valve the one that it would have bought.
 */
export function shimCosts(
	valves: readonly ShimmedValve[],
	hand: readonly number[],
	sold: readonly number[],
	within: 'may-move' | 'stays'
): number[][] {
	const costs = valves.map((valve, row) => [
		...hand.map((shim, at) => costOf(valve, shim) + (at === row ? 0 : moved)),
		...sold.map((size, at) => (at === row ? purchase + costOf(valve, size) : impossible))
	]);
	if (within === 'stays')
		for (const [row, line] of costs.entries()) {
			const own = line[row] ?? impossible;
			if (own < impossible) line.fill(impossible).splice(row, 1, own);
		}
	return costs;
}

/** The sold size that brings a valve nearest to the middle of its limits. */
export function soldFor(valve: ShimmedValve, sizes: ShimSizes): number {
	const wanted = spaceMm(valve) - middleMm(valve);
	// The smallest or largest that is sold may still end within limits: the cost says whether it does.
	const found = nearestShimMm(Math.min(sizes.toMm, Math.max(sizes.fromMm, wanted)), sizes);
	return found.ok ? found.value : sizes.fromMm;
}

function costOf(valve: ShimmedValve, shimMm: number): number {
	const lash = tidy(spaceMm(valve) - shimMm);
	if (lash < valve.leastMm - 1e-9 || lash > valve.mostMm + 1e-9) return impossible;
	return Math.round(Math.abs(lash - middleMm(valve)) * 1e4) * tenthOfMicrometre;
}
