import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cheapestAssignment } from '$lib/kernel/geometry/assignment';
import { shimPlan } from '$lib/kernel/geometry/shim-plan';
import type { ShimmedValve } from '$lib/kernel/geometry/shimmed-valve';
import {
	lashAtValveMm,
	nearestShimMm,
	screwTurnDeg,
	shimCount,
	shimForLashMm
} from '$lib/kernel/geometry/valve-lash';
import type { Outcome } from '$lib/kernel/outcome';
import { expectWithin, referenceOf } from '../../support/reference';

function value<T>(outcome: Outcome<T>): T {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
}
const odd = [Number.NaN, Infinity, -1];

describe('lash and shims, published', () => {
	type Entry = { asks: 'shim' | 'count' | 'nearest' | 'turn' | 'rocker' } & Record<
		'fittedMm' | 'lashMm' | 'wantedMm' | 'fromMm' | 'toMm' | 'stepMm' | 'changeMm' | 'pitchMm',
		number
	> & { gapMm: number; ratio: number };
	const sums: Record<Entry['asks'], (entry: Entry) => Outcome<number>> = {
		shim: ({ fittedMm, lashMm, wantedMm }) => shimForLashMm(fittedMm, lashMm, wantedMm),
		count: ({ fromMm, toMm, stepMm }) => shimCount({ fromMm, toMm, stepMm }),
		nearest: ({ wantedMm, stepMm }) => nearestShimMm(wantedMm, { fromMm: 2, toMm: 3, stepMm }),
		turn: ({ changeMm, pitchMm }) => screwTurnDeg(changeMm, pitchMm),
		rocker: ({ gapMm, ratio }) => lashAtValveMm(gapMm, ratio)
	};
	it.each(referenceOf<Entry>('valve-shims.json'))('%s', (_, entry) => {
		expectWithin(value(sums[entry.asks](entry)), entry);
	});
	it('S03 the chart’s shim is the nearest sold one (chart example, 2.95 mm fitted, 0.47 mm measured)', () => {
		const exact = value(shimForLashMm(2.95, 0.47, 0.27));
		expect(value(nearestShimMm(exact, { fromMm: 2, toMm: 4, stepMm: 0.05 }))).toBe(3.15);
	});
});

describe('a shim', () => {
	const mm = (least: number, most: number) =>
		fc.integer({ min: least, max: most }).map((one) => one / 1000);
	it('of the size that is reckoned brings the wanted lash', () => {
		fc.assert(
			fc.property(mm(1500, 4000), mm(10, 900), mm(50, 500), (fitted, lash, wanted) => {
				const shim = value(shimForLashMm(fitted, lash, wanted));
				expect(fitted + lash - shim).toBeCloseTo(wanted, 6);
			})
		);
	});
	it('of the nearest size lies within half a step, and is one that is sold', () => {
		const sizes = { fromMm: 2, toMm: 3.5, stepMm: 0.025 };
		fc.assert(
			fc.property(mm(2000, 3500), (wanted) => {
				const found = value(nearestShimMm(wanted, sizes));
				expect(Math.abs(found - wanted)).toBeLessThanOrEqual(0.0125 + 1e-6);
				expect(Math.round((found - 2) * 1e6) % 25_000).toBe(0);
			})
		);
	});
	it('as near as another is the thinner one', () => {
		expect(value(nearestShimMm(2.725, { fromMm: 2, toMm: 3, stepMm: 0.05 }))).toBe(2.7);
		expect(value(nearestShimMm(2.7251, { fromMm: 2, toMm: 3, stepMm: 0.05 }))).toBe(2.75);
	});
	it('that is not sold, or reckoned from nothing, is refused', () => {
		const sizes = { fromMm: 2, toMm: 3, stepMm: 0.05 };
		expect(nearestShimMm(3.03, sizes)).toEqual({
			ok: false,
			because: 'no shim of that size is sold in these steps'
		});
		expect(nearestShimMm(1.9, sizes).ok).toBe(false);
		expect(shimForLashMm(2.5, 0, 0.2).ok).toBe(false);
		expect(shimForLashMm(0.1, 0.05, 0.4).ok).toBe(false);
		expect(shimCount({ fromMm: 2, toMm: 3, stepMm: 0.03 }).ok).toBe(false);
		for (const one of odd) {
			expect(nearestShimMm(one, sizes).ok).toBe(false);
			for (const field of ['fromMm', 'toMm', 'stepMm'])
				expect(shimCount({ ...sizes, [field]: one }).ok).toBe(false);
			expect(shimForLashMm(one, 0.3, 0.2).ok).toBe(false);
			expect(shimForLashMm(2.5, one, 0.2).ok).toBe(false);
			expect(screwTurnDeg(one, 1).ok).toBe(false);
			expect(screwTurnDeg(0.1, one).ok).toBe(false);
			expect(lashAtValveMm(one, 1.5).ok).toBe(false);
			expect(lashAtValveMm(0.2, one).ok).toBe(false);
		}
	});
});

describe('the cheapest assignment', () => {
	const total = (costs: readonly (readonly number[])[], columns: readonly number[]) =>
		columns.reduce((sum, column, row) => sum + (costs[row]?.[column] ?? NaN), 0);
	/** Every way there is. */
	function cheapest(costs: readonly (readonly number[])[], taken: readonly number[] = []): number {
		const row = costs[taken.length];
		if (!row) return 0;
		return Math.min(
			...row.map((cost, column) =>
				taken.includes(column) ? Infinity : cost + cheapest(costs, [...taken, column])
			)
		);
	}
	it.each(referenceOf<{ costs: number[][] }>('assignments.json'))('%s', (_, entry) => {
		const columns = cheapestAssignment(entry.costs);
		expect(new Set(columns).size).toBe(entry.costs.length);
		expectWithin(total(entry.costs, columns), entry);
	});
	const table = fc
		.tuple(fc.integer({ min: 1, max: 6 }), fc.integer({ min: 0, max: 2 }), fc.constantFrom(3, 1000))
		.chain(([rows, more, most]) =>
			fc.array(
				fc.array(fc.integer({ min: -most, max: most }), {
					minLength: rows + more,
					maxLength: rows + more
				}),
				{ minLength: rows, maxLength: rows }
			)
		);
	it('costs what the cheapest of all ways costs', () => {
		fc.assert(
			fc.property(table, (costs) => {
				const columns = cheapestAssignment(costs);
				expect(new Set(columns).size).toBe(costs.length);
				expect(total(costs, columns)).toBe(cheapest(costs));
			}),
			{ numRuns: 400 }
		);
	});
	it('costs the same whichever row comes first', () => {
		fc.assert(
			fc.property(table, (costs) => {
				const turned = costs.toReversed();
				expect(total(turned, cheapestAssignment(turned))).toBe(
					total(costs, cheapestAssignment(costs))
				);
			})
		);
	});
	it('takes no other table', () => {
		expect(() => cheapestAssignment([[1], [2]])).toThrow(RangeError);
		expect(() => cheapestAssignment([[1, 2], [3]])).toThrow(RangeError);
		expect(() => cheapestAssignment([[Number.NaN]])).toThrow(RangeError);
		expect(cheapestAssignment([])).toEqual([]);
	});
});

describe('a plan of shims', () => {
	const sizes = { fromMm: 2, toMm: 3, stepMm: 0.05 };
	const inlet = { leastMm: 0.18, mostMm: 0.22 };
	const exhaust = { leastMm: 0.28, mostMm: 0.32 };

	it('swaps before it buys', () => {
		// Each has what the other wants.
		const plan = value(
			shimPlan(
				[
					{ name: 'E1', shimMm: 2.5, lashMm: 0.4, ...exhaust },
					{ name: 'E2', shimMm: 2.6, lashMm: 0.2, ...exhaust }
				],
				[],
				sizes
			)
		);
		expect(plan.bought).toBe(0);
		expect(plan.choices).toEqual([
			{ valve: 'E1', shimMm: 2.6, from: 'valve', giver: 'E2', lashMm: 0.3, offMm: 0 },
			{ valve: 'E2', shimMm: 2.5, from: 'valve', giver: 'E1', lashMm: 0.3, offMm: 0 }
		]);
		expect(plan.spareMm).toEqual([]);
	});
	it('looks in the box, then buys by size and count', () => {
		const tight = { lashMm: 0.1, ...inlet };
		const plan = value(
			shimPlan(
				[
					{ name: 'I1', shimMm: 2.5, ...tight },
					{ name: 'I2', shimMm: 2.5, ...tight },
					{ name: 'I3', shimMm: 2.5, ...tight }
				],
				[2.41, 2.9],
				sizes
			)
		);
		expect(plan.choices.filter((one) => one.from === 'box')).toHaveLength(1);
		expect(plan.buy).toEqual([{ sizeMm: 2.4, count: 2 }]);
		expect(plan.bought).toBe(2);
		expect(plan.spareMm).toEqual([2.5, 2.5, 2.5, 2.9]);
		expect(plan.totalOffMm).toBeCloseTo(0.01, 6);
	});
	it('leaves alone what is right', () => {
		const right = { shimMm: 2.5, lashMm: 0.2, ...inlet };
		const plan = value(
			shimPlan(
				[
					{ name: 'I1', ...right },
					{ name: 'I2', ...right }
				],
				[2.5],
				sizes
			)
		);
		expect(plan.choices.map((one) => one.from)).toEqual(['stays', 'stays']);
	});
	it('leaves what is right where it is asked to, even if that means to buy', () => {
		// What I1 gives away would serve I2, and the box has something for I1.
		const valves = [
			{ name: 'I1', shimMm: 2.48, lashMm: 0.22, ...inlet },
			{ name: 'I2', shimMm: 2.4, lashMm: 0.27, ...inlet }
		];
		const moving = value(shimPlan(valves, [2.52], sizes));
		const staying = value(shimPlan(valves, [2.52], sizes, 'stays'));
		expect(moving.choices.map((one) => one.from)).toEqual(['box', 'valve']);
		expect(staying.choices.map((one) => one.from)).toEqual(['stays', 'bought']);
		expect([moving.bought, staying.bought]).toEqual([0, 1]);
	});
	it('takes the end of the series where that still ends within limits', () => {
		const plan = value(shimPlan([{ name: 'I1', shimMm: 2.9, lashMm: 0.315, ...inlet }], [], sizes));
		expect(plan.buy).toEqual([{ sizeMm: 3, count: 1 }]);
		expect(plan.choices[0]?.lashMm).toBe(0.215);
	});
	it('names the valves that nothing brings within limits', () => {
		const found = shimPlan(
			[
				{ name: 'I1', shimMm: 2.5, lashMm: 0.2, ...inlet },
				{ name: 'E4', shimMm: 2.9, lashMm: 0.6, ...exhaust }
			],
			[],
			sizes
		);
		expect(found.ok ? '' : found.because).toContain('E4');
		expect(found.ok ? '' : found.because).not.toContain('I1');
	});
	it('refuses what it cannot reckon from, with the valve named', () => {
		const good = { name: 'I1', shimMm: 2.5, lashMm: 0.2, ...inlet };
		const because = (valve: Partial<ShimmedValve>, box: number[] = []) => {
			const found = shimPlan([{ ...good, ...valve }], box, sizes);
			return found.ok ? '' : found.because;
		};
		expect(because({ lashMm: 0 })).toMatch(/^I1: a valve without lash/);
		for (const one of [...odd, 1e9]) {
			expect(because({ shimMm: one })).toMatch(/^I1: /);
			expect(because({ lashMm: one })).toMatch(/^I1: /);
			expect(because({ mostMm: one })).toMatch(/^I1: /);
			expect(because({}, [one])).toContain('box');
		}
		expect(shimPlan([], [], sizes).ok).toBe(false);
		expect(shimPlan([good, good], [], sizes).ok).toBe(false);
		expect(shimPlan([good], [], { ...sizes, stepMm: 0 }).ok).toBe(false);
	});

	const mm = (least: number, most: number) =>
		fc.integer({ min: least, max: most }).map((one) => one / 100);
	const engine = fc
		.array(fc.record({ shimMm: mm(230, 270), lashMm: mm(8, 45), out: fc.boolean() }), {
			minLength: 1,
			maxLength: 5
		})
		.map((valves) =>
			valves.map(({ out, ...one }, at) => ({
				name: `V${at + 1}`,
				...one,
				...(out ? exhaust : inlet)
			}))
		);
	const box = fc.array(mm(230, 280), { maxLength: 2 });

	/** Every way to fit what is at hand or to buy: fewest bought, then least off the middle. */
	function best(valves: ShimmedValve[], hand: number[]): [number, number] {
		const [valve, ...others] = valves;
		if (!valve) return [0, 0];
		const middle = (valve.leastMm + valve.mostMm) / 2;
		const off = (shim: number) => {
			const lash = valve.shimMm + valve.lashMm - shim;
			const fits = lash >= valve.leastMm - 1e-9 && lash <= valve.mostMm + 1e-9;
			return fits ? Math.abs(lash - middle) : Infinity;
		};
		const sold = Array.from({ length: 21 }, (_, at) => 2 + at * 0.05);
		const ways: [number, number][] = hand.map((shim, at) => {
			const [bought, rest] = best(others, hand.toSpliced(at, 1));
			return [bought, rest + off(shim)];
		});
		const [bought, rest] = best(others, hand);
		ways.push([bought + 1, rest + Math.min(...sold.map(off))]);
		return ways
			.filter(([, sum]) => sum < Infinity)
			.reduce(
				(least, one) =>
					one[0] < least[0] || (one[0] === least[0] && one[1] < least[1]) ? one : least,
				[Infinity, Infinity]
			);
	}
	it('is the best of all ways there are', () => {
		fc.assert(
			fc.property(engine, box, (valves, loose) => {
				const [bought, off] = best(valves, [...valves.map((one) => one.shimMm), ...loose]);
				const found = shimPlan(valves, loose, sizes);
				expect(found.ok).toBe(bought < Infinity);
				if (!found.ok) return;
				expect(found.value.bought).toBe(bought);
				expect(found.value.totalOffMm).toBeCloseTo(off, 6);
			}),
			{ numRuns: 150 }
		);
	});
	it('ends every lash within its limits, and uses no shim twice', () => {
		fc.assert(
			fc.property(engine, box, (valves, loose) => {
				const found = shimPlan(valves, loose, sizes);
				fc.pre(found.ok);
				const { choices, buy, spareMm } = value(found);
				for (const [at, one] of valves.entries()) {
					const lash = one.shimMm + one.lashMm - (choices[at]?.shimMm ?? NaN);
					expect(lash).toBeCloseTo(choices[at]?.lashMm ?? NaN, 6);
					expect(lash).toBeGreaterThanOrEqual(one.leastMm - 1e-6);
					expect(lash).toBeLessThanOrEqual(one.mostMm + 1e-6);
				}
				const boughtMm = buy.flatMap(({ sizeMm, count }) => Array<number>(count).fill(sizeMm));
				const before = [...valves.map((one) => one.shimMm), ...loose, ...boughtMm];
				const after = [...choices.map((one) => one.shimMm), ...spareMm];
				expect(after.toSorted()).toEqual(before.toSorted());
			})
		);
	});
	it('asked to leave what is right, touches no valve within its limits and no other plan buys more', () => {
		fc.assert(
			fc.property(engine, box, (valves, loose) => {
				const [moving, staying] = [
					shimPlan(valves, loose, sizes),
					shimPlan(valves, loose, sizes, 'stays')
				];
				fc.pre(moving.ok && staying.ok);
				expect(value(moving).bought).toBeLessThanOrEqual(value(staying).bought);
				for (const [at, one] of valves.entries()) {
					const right = one.lashMm >= one.leastMm - 1e-9 && one.lashMm <= one.mostMm + 1e-9;
					if (right) expect(value(staying).choices[at]?.from).toBe('stays');
				}
			})
		);
	});
	it('is the same plan whichever valve is written first', () => {
		fc.assert(
			fc.property(engine, box, (valves, loose) => {
				const [first, second] = [
					shimPlan(valves, loose, sizes),
					shimPlan(valves.toReversed(), loose.toReversed(), sizes)
				];
				expect(second.ok).toBe(first.ok);
				if (!first.ok || !second.ok) return;
				expect(second.value.bought).toBe(first.value.bought);
				expect(second.value.totalOffMm).toBeCloseTo(first.value.totalOffMm, 9);
			})
		);
	});
	it('permutes with the valves where only one way is best', () => {
		// The box holds one shim for each valve; none of the fitted ones serves any.
		const wanted = fc.uniqueArray(fc.integer({ min: 0, max: 30 }), { minLength: 2, maxLength: 8 });
		fc.assert(
			fc.property(wanted, (steps) => {
				const loose = steps.map((one) => 2.2 + one * 0.02);
				const valves = loose.map((size, at) => ({
					name: `V${at}`,
					shimMm: 0.5,
					lashMm: size + 0.2 - 0.5,
					leastMm: 0.195,
					mostMm: 0.205
				}));
				for (const these of [valves, valves.toReversed()])
					for (const one of value(shimPlan(these, loose, sizes)).choices)
						expect(one.shimMm).toBe(loose[valves.findIndex(({ name }) => name === one.valve)]);
			})
		);
	});
	it('of sixteen valves and a full box is found in a few milliseconds', () => {
		const valves = Array.from({ length: 16 }, (_, at) => ({
			name: `V${at + 1}`,
			shimMm: 2.3 + ((at * 7) % 16) * 0.02,
			lashMm: 0.12 + ((at * 5) % 11) * 0.02,
			...(at % 2 ? exhaust : inlet)
		}));
		const loose = Array.from({ length: 60 }, (_, at) => 2.2 + at * 0.01);
		shimPlan(valves, loose, sizes);
		const began = performance.now();
		for (let turn = 0; turn < 20; turn++) expect(shimPlan(valves, loose, sizes).ok).toBe(true);
		expect((performance.now() - began) / 20).toBeLessThan(20);
	});
});
