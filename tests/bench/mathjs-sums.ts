import * as math from 'mathjs';
import type { Unit } from 'mathjs';
import { bolts24, bore12, valves16 } from './figures';

/**
 * The sums of the benchmark as somebody would write them who keeps every length as a mathjs unit.
 * Each function makes its units once and gives the sum that is timed.
 */
const mm = (value: number): Unit => math.unit(value, 'mm');
// The types of mathjs leave out what its functions take: lengths, added, compared, largest first.
const plus = (a: Unit, b: Unit) => math.add(a, b) as Unit;
const less = (a: Unit, b: Unit) => math.subtract(a, b) as Unit;
const below = (a: Unit, b: Unit) => math.smaller(a, b) as boolean;
const notAbove = (a: Unit, b: Unit) => math.smallerEq(a, b) as boolean;
const size = (a: Unit) => math.abs(a as never) as unknown as Unit;
const spread = (these: Unit[]) =>
	less(math.max(...(these as never[])) as Unit, math.min(...(these as never[])) as Unit);
const widest = (these: Unit[]) => math.max(...(these as never[])) as Unit;
const inMm = (a: Unit) => math.round(a.toNumber('mm'), 6);

export function ruledGridInUnits(): () => unknown[] {
	const grid = bore12.gridMm.map((row) => row.map(mm));
	const [uncertainty, most] = [mm(bore12.expandedUncertaintyMm), mm(bore12.mostMm)];
	const rule = (reading: Unit) =>
		notAbove(reading, less(most, uncertainty))
			? 'within'
			: below(plus(most, uncertainty), reading)
				? 'out'
				: 'too-close';
	return () => {
		const round = widest(grid.map(spread));
		const columns = (grid[0] ?? []).map((_, plane) => grid.map((row) => row[plane] as Unit));
		const taper = widest(columns.map(spread));
		return [inMm(round), rule(round), inMm(taper), rule(taper)];
	};
}

/** From the middle outwards, as the kernel goes where bolts stand on no ring: no two in one place first. */
export function orderInUnits(): () => string[] {
	const bolts = bolts24.map(({ id, xMm, yMm }) => ({ id, x: mm(xMm), y: mm(yMm) }));
	type Placed = { x: Unit; y: Unit };
	const mean = (these: Unit[]) => math.mean(these as never) as unknown as Unit;
	const times = (a: Unit, by: number) => math.multiply(a, by) as Unit;
	const apart = (a: Placed, b: Placed) =>
		math.sqrt(
			math.add(math.square(less(a.x, b.x) as never), math.square(less(a.y, b.y) as never)) as never
		) as unknown as Unit;
	const [hair, onePlace] = [mm(1e-9), mm(1)];
	return () => {
		for (const [at, a] of bolts.entries())
			for (const b of bolts.slice(at + 1))
				if (below(apart(a, b), onePlace)) throw new Error('two bolts stand in one place');
		const middle = { x: mean(bolts.map((one) => one.x)), y: mean(bolts.map((one) => one.y)) };
		let left = bolts
			.map((one) => ({ ...one, reach: apart(one, middle) }))
			.sort((a, b) => a.id.localeCompare(b.id, 'en', { numeric: true }));
		const room = plus(times(widest(left.map((one) => one.reach)), 0.02), hair);
		const out: (typeof left)[number][] = [];
		while (left.length > 0) {
			const nearest = math.min(...(left.map((one) => one.reach) as never[])) as Unit;
			const sound = left.filter((one) => notAbove(one.reach, plus(nearest, room)));
			const last = out.at(-1);
			const next = sound.reduce((best, one) =>
				last && below(times(apart(best, last), 1.000001), apart(one, last)) ? one : best
			);
			out.push(next);
			left = left.filter((one) => one !== next);
		}
		return out.map((one) => one.id);
	};
}

/** The same shortest augmenting paths, every price and cost a length: a purchase costs a kilometre. */
export function shimPlanInUnits(): () => unknown[] {
	const valves = valves16.valves.map((one) => ({
		space: plus(mm(one.shimMm), mm(one.lashMm)),
		least: mm(one.leastMm),
		most: mm(one.mostMm),
		middle: mm((one.leastMm + one.mostMm) / 2)
	}));
	const hand = [...valves16.valves.map((one) => one.shimMm), ...valves16.boxMm].map(mm);
	const { fromMm, toMm, stepMm } = valves16.sizes;
	const sold = Array.from({ length: Math.round((toMm - fromMm) / stepMm) + 1 }, (_, at) =>
		mm(fromMm + at * stepMm)
	);
	const [none, hair, purchase, impossible, endless] = [mm(0), mm(1e-9), mm(1e6), mm(1e9), mm(1e12)];
	type Valve = (typeof valves)[number];
	const costOf = (valve: Valve, shim: Unit) => {
		const lash = less(valve.space, shim);
		return below(lash, less(valve.least, hair)) || below(plus(valve.most, hair), lash)
			? impossible
			: size(less(lash, valve.middle));
	};
	return () => {
		const costs = valves.map((valve, row) => [
			...hand.map((shim) => costOf(valve, shim)),
			...valves.map((_, column) =>
				column === row
					? plus(
							purchase,
							math.min(...(sold.map((shim) => costOf(valve, shim)) as never[])) as Unit
						)
					: impossible
			)
		]);
		const columns = costs[0]?.length ?? 0;
		const rowPrice = costs.map(() => none);
		const columnPrice = Array.from({ length: columns }, () => none);
		const holder = Array.from({ length: columns }, () => -1);
		for (const first of costs.keys()) {
			const reach = Array.from({ length: columns }, () => endless);
			const before = Array.from({ length: columns }, () => -1);
			const settled: number[] = [];
			let [row, last, length] = [first, -1, none];
			while (row >= 0) {
				let nearest = -1;
				for (let one = 0; one < columns; one++) {
					if (settled.includes(one)) continue;
					const reduced = less(
						less(costs[row]?.[one] as Unit, rowPrice[row] as Unit),
						columnPrice[one] as Unit
					);
					const through = plus(length, reduced);
					if (below(through, reach[one] as Unit)) [reach[one], before[one]] = [through, last];
					if (nearest < 0 || below(reach[one] as Unit, reach[nearest] as Unit)) nearest = one;
				}
				settled.push(nearest);
				[last, length, row] = [nearest, reach[nearest] as Unit, holder[nearest] ?? -1];
			}
			rowPrice[first] = plus(rowPrice[first] as Unit, length);
			for (const one of settled.slice(0, -1)) {
				const by = less(length, reach[one] as Unit);
				const held = holder[one] ?? -1;
				columnPrice[one] = less(columnPrice[one] as Unit, by);
				rowPrice[held] = plus(rowPrice[held] as Unit, by);
			}
			for (let one = last; one >= 0; one = before[one] ?? -1) {
				const from = before[one] ?? -1;
				holder[one] = from < 0 ? first : (holder[from] ?? -1);
			}
		}
		const bought = holder.slice(hand.length).filter((row) => row >= 0).length;
		const total = holder.reduce(
			(sum, row, column) => (row < 0 ? sum : plus(sum, costs[row]?.[column] as Unit)),
			none
		);
		return [bought, math.round(total.toNumber('mm') - bought * 1e6, 6)];
	};
}
