import { bench, describe } from 'vitest';
import { orderFromMiddle } from '$lib/kernel/fasteners/tightening-order';
import { outOfRoundMm, taperMm } from '$lib/kernel/geometry/diameter-grid';
import { shimPlan } from '$lib/kernel/geometry/shim-plan';
import { ruleReading } from '$lib/kernel/measurement/ruling';
import type { Outcome } from '$lib/kernel/outcome';
import { orderInUnits, ruledGridInUnits, shimPlanInUnits } from './mathjs-sums';
import { bolts24, bore12, valves16 } from './figures';

/**
 * The kernel beside the same sums written with mathjs and its units. Both sides are given their
 * figures ready made (numbers here, units there), and must agree before either is timed.
 */
function value<T>(outcome: Outcome<T>): T {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
}

function same(what: string, ours: unknown, theirs: unknown): void {
	const [a, b] = [JSON.stringify(ours), JSON.stringify(theirs)];
	if (a !== b) throw new Error(`${what}: the two sides differ, ${a} and ${b}`);
}

function ruledGrid() {
	const { gridMm, expandedUncertaintyMm, mostMm } = bore12;
	const rule = (found: Outcome<number>) =>
		ruleReading({
			question: 'run-again',
			value: value(found),
			expandedUncertainty: expandedUncertaintyMm,
			most: mostMm
		});
	const [round, taper] = [outOfRoundMm(gridMm), taperMm(gridMm)];
	return [value(round), value(rule(round)).ruling, value(taper), value(rule(taper)).ruling];
}
const plan = () => {
	const { bought, totalOffMm } = value(shimPlan(valves16.valves, valves16.boxMm, valves16.sizes));
	return [bought, totalOffMm];
};

const grids = ruledGridInUnits();
const orders = orderInUnits();
const shims = shimPlanInUnits();
same('grid', ruledGrid(), grids());
same('order', value(orderFromMiddle(bolts24)), orders());
same('shims', plan(), shims());

describe('out-of-round and taper of a bore, twelve readings, ruled', () => {
	bench('kernel', () => void ruledGrid());
	bench('mathjs units', () => void grids());
});

describe('tightening order of 24 bolts', () => {
	bench('kernel', () => void orderFromMiddle(bolts24));
	bench('mathjs units', () => void orders());
});

describe('shims of 16 valves from 16 fitted, 24 loose and what is sold', () => {
	bench('kernel', () => void plan());
	bench('mathjs units', () => void shims());
});
