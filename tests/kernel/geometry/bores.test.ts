import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { crushFromGap, crushOf, freeSpreadMm } from '$lib/kernel/geometry/bearing-shell';
import {
	deckHeight,
	endFloatMm,
	ringGapGrowthMm,
	ringGapInMm
} from '$lib/kernel/geometry/end-play';
import { clearanceFromShellsMm, fitOf, ofDiameter } from '$lib/kernel/geometry/fit';
import { onScaleMm, threadClearance } from '$lib/kernel/geometry/gauging-thread';
import { gasketFor } from '$lib/kernel/geometry/gasket-class';
import { extremesOf, shapeOf } from '$lib/kernel/geometry/grid-shape';
import { nextSize } from '$lib/kernel/geometry/next-size';
import { chooseShells } from '$lib/kernel/geometry/shell-choice';
import type { Outcome } from '$lib/kernel/outcome';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const reading = fc.integer({ min: 73_900, max: 74_200 }).map((one) => one / 1000);
const grid = fc.integer({ min: 1, max: 4 }).chain((planes) =>
	fc.array(fc.array(reading, { minLength: planes, maxLength: planes }), {
		minLength: 3,
		maxLength: 6
	})
);

describe('the shape along a bore', () => {
	it.each([
		['straight', [[74], [74.002], [74]]],
		['bell-mouthed', [[74.03], [74.01], [74.03]]],
		['barrel', [[74.01], [74.03], [74.01]]],
		['tapered', [[74.05], [74.03], [74.01]]]
	] as const)('is called %s', (name, readings) => {
		expect(value(shapeOf(readings, 0.005)).name).toBe(name);
	});
	it('keeps its bulge and turns its taper when it is read from the other end', () => {
		fc.assert(
			fc.property(grid, (rows) => {
				const [there, back] = [rows, rows.toReversed()].map((one) => value(shapeOf(one, 0)));
				// Both are rounded to the nanometre, halves upwards.
				expect(back?.taperMm).toBeCloseTo(-(there?.taperMm ?? NaN), 5);
				expect(back?.endsLessMiddleMm).toBeCloseTo(there?.endsLessMiddleMm ?? NaN, 5);
			})
		);
	});
	it('does not change when every reading is larger by the same', () => {
		fc.assert(
			fc.property(grid, number(-5, 5), (rows, more) => {
				const moved = rows.map((row) => row.map((one) => one + more));
				const [a, b] = [rows, moved].map((one) => value(shapeOf(one, 0.001)));
				expect(b?.taperMm).toBeCloseTo(a?.taperMm ?? NaN, 5);
				expect(b?.endsLessMiddleMm).toBeCloseTo(a?.endsLessMiddleMm ?? NaN, 5);
			})
		);
	});
	it('says where it is smallest and largest', () => {
		fc.assert(
			fc.property(grid, (rows) => {
				const { least, most } = value(extremesOf(rows));
				expect(rows[least.depth]?.[least.plane]).toBe(Math.min(...rows.flat()));
				expect(rows[most.depth]?.[most.plane]).toBe(Math.max(...rows.flat()));
			})
		);
	});
	it('needs three depths, all of them read', () => {
		expect(shapeOf([[74], [74]], 0)).toMatchObject({ ok: false });
		expect(shapeOf([[74], [null], [74]], 0)).toMatchObject({ ok: false });
		expect(shapeOf([[74], [74], [74]], -1)).toMatchObject({ ok: false });
	});
});

describe('the next size', () => {
	const steps = [0.25, 0.5, 0.75, 1];
	it('is the smallest that cleans up, and no smaller one would', () => {
		fc.assert(
			fc.property(number(0, 0.9), number(0, 0.1), (worn, stock) => {
				const bore = value(nextSize('bore', 74 + worn, 74, steps.toReversed(), stock));
				expect(bore.leftMm).toBeGreaterThanOrEqual(stock - 1e-6);
				const smaller = steps.filter((one) => one < bore.stepMm);
				for (const one of smaller) expect(one - worn).toBeLessThan(stock + 1e-6);
				// A journal is the bore's mirror image.
				expect(value(nextSize('journal', 74 - worn, 74, steps, stock)).stepMm).toBe(bore.stepMm);
			})
		);
	});
	it('says so where none cleans up, or none is listed', () => {
		const none = nextSize('bore', 75.2, 74, steps, 0);
		expect(none.ok ? '' : none.because).toContain('no listed size');
		expect(nextSize('bore', 74.1, 74, [], 0)).toMatchObject({ ok: false });
		expect(nextSize('bore', 74.1, 74, [-0.25], 0)).toMatchObject({ ok: false });
	});
});

describe('fits and clearances', () => {
	it('are the same in inches', () => {
		fc.assert(
			fc.property(
				number(50, 60),
				number(0, 0.1),
				number(40, 49),
				number(0, 0.1),
				(o, ow, i, iw) => {
					const at = (scale: number) =>
						value(
							fitOf(
								{ leastMm: o * scale, mostMm: (o + ow) * scale },
								{ leastMm: i * scale, mostMm: (i + iw) * scale }
							)
						);
					expect(at(25.4).leastMm / 25.4).toBeCloseTo(at(1).leastMm, 5);
					expect(at(1).mostMm - at(1).leastMm).toBeCloseTo(ow + iw, 5);
				}
			)
		);
	});
	it('from shells: a thicker wall closes the gap twice', () => {
		fc.assert(
			fc.property(number(42.9, 43.1), number(1.4, 1.5), number(0, 0.01), (housing, wall, more) => {
				const [a, b] = [wall, wall + more].map((w) => value(clearanceFromShellsMm(housing, w, 40)));
				expect((a ?? NaN) - (b ?? NaN)).toBeCloseTo(2 * more, 5);
			})
		);
	});
	it('crush and press go together, and no press is no crush', () => {
		fc.assert(
			fc.property(number(30, 90), number(-0.1, 0.1), (housing, proud) => {
				const found = value(crushOf((Math.PI * housing) / 2 + proud, housing));
				expect(found.crushMm).toBeCloseTo(proud, 5);
				expect(found.interferenceMm).toBeCloseTo((2 * proud) / Math.PI, 5);
			})
		);
		expect(crushOf(43, 43)).toMatchObject({ ok: false });
		expect(value(freeSpreadMm(43.6, 43))).toBe(0.6);
	});
});

describe('a gauging thread', () => {
	const scale = [
		{ widthMm: 2.2, clearanceMm: 0.05 },
		{ widthMm: 1.4, clearanceMm: 0.1 },
		{ widthMm: 3, clearanceMm: 0.025 }
	];
	it('says what its marks say, less the wider it is, and nothing beyond its scale', () => {
		for (const mark of scale) expect(value(onScaleMm(scale, mark.widthMm))).toBe(mark.clearanceMm);
		fc.assert(
			fc.property(number(1.4, 3), number(1.4, 3), (a, b) => {
				const [wide, narrow] = [Math.max(a, b), Math.min(a, b)];
				expect(value(onScaleMm(scale, wide))).toBeLessThanOrEqual(value(onScaleMm(scale, narrow)));
			})
		);
		for (const width of [1.3, 3.1, NaN])
			expect(onScaleMm(scale, width)).toMatchObject({ ok: false });
		expect(
			onScaleMm(
				[
					{ widthMm: 1, clearanceMm: 0.02 },
					{ widthMm: 2, clearanceMm: 0.03 }
				],
				1.5
			)
		).toMatchObject({ ok: false });
	});
	it('of even width has no taper', () => {
		expect(value(threadClearance([0.05, 0.05]))).toEqual({
			leastMm: 0.05,
			mostMm: 0.05,
			meanMm: 0.05,
			taperMm: 0
		});
		for (const odd of [[], [0], [1.2], [NaN]])
			expect(threadClearance(odd)).toMatchObject({ ok: false });
	});
});

describe('floats, gaps, decks', () => {
	it('do not care which way the dial is set', () => {
		fc.assert(
			fc.property(number(-5, 5), number(-5, 5), number(-2, 2), (a, b, zero) => {
				expect(value(endFloatMm(a, b))).toBeCloseTo(value(endFloatMm(b + zero, a + zero)), 5);
				expect(value(deckHeight([a, b])).heightMm).toBeCloseTo(
					value(deckHeight([b, a])).heightMm,
					9
				);
			})
		);
		expect(deckHeight([0.4])).toMatchObject({ ok: false });
	});
	it('an answer is a number or a reason, whatever is asked', () => {
		const any = fc.double();
		fc.assert(
			fc.property(any, any, any, (a, b, c) => {
				for (const found of [
					endFloatMm(a, b),
					ringGapGrowthMm(a),
					ofDiameter(a, b),
					clearanceFromShellsMm(a, b, c),
					freeSpreadMm(a, b)
				])
					expect(found.ok ? Number.isFinite(found.value) : found.because !== '').toBe(true);
				const size = nextSize('bore', a, b, [c], 0);
				if (size.ok) expect(Number.isFinite(size.value.leftMm)).toBe(true);
				const crush = crushOf(a, b);
				if (crush.ok) expect(Number.isFinite(crush.value.interferenceMm)).toBe(true);
			}),
			{ numRuns: 1000 }
		);
	});
});

describe('shells and gaskets chosen', () => {
	const limits = { leastMm: 0.02, mostMm: 0.048 };
	it('a shell lies inside the limits, and no listed one lies nearer their middle', () => {
		const walls = fc.array(number(1.47, 1.5), { minLength: 1, maxLength: 6 });
		fc.assert(
			fc.property(walls, (these) => {
				const { chosen } = value(chooseShells(43, 39.99, these, limits));
				const off = these.map((one) => Math.abs(43 - 2 * one - 39.99 - 0.034));
				if (chosen === undefined) expect(Math.min(...off)).toBeGreaterThan(0.014 - 2e-6);
				else {
					expect(off[chosen]).toBeLessThanOrEqual(0.014 + 2e-6);
					expect(off[chosen]).toBeLessThanOrEqual(Math.min(...off) + 2e-6);
				}
			})
		);
		expect(chooseShells(43, 39.99, [], limits)).toMatchObject({ ok: false });
		expect(chooseShells(43, 39.99, [1.489], { leastMm: 0.05, mostMm: 0.02 })).toMatchObject({
			ok: false
		});
		const none = value(chooseShells(43, 39.8, [1.489], limits));
		expect(none).toEqual({ clearancesMm: [0.222] });
		expect(chooseShells(43, 39.99, [NaN], limits)).toMatchObject({ ok: false });
	});
	it('a gasket goes by the highest piston alone', () => {
		const classes = [
			{ name: 'one notch', leastMm: 0.4, mostMm: 0.49 },
			{ name: 'two notches', leastMm: 0.5, mostMm: 0.59 }
		];
		expect(gasketFor([0.42, 0.52, 0.41], classes)).toEqual({
			ok: true,
			value: { name: 'two notches', decidedBy: 1 }
		});
		fc.assert(
			fc.property(number(0.4, 0.49), number(-0.1, 0.4), (highest, lower) => {
				expect(value(gasketFor([lower, highest], classes)).name).toBe('one notch');
			})
		);
		for (const odd of [[], [0.495], [0.7], [NaN]])
			expect(gasketFor(odd, classes)).toMatchObject({ ok: false });
		expect(gasketFor([0.45], [])).toMatchObject({ ok: false });
	});
	it('crush read as a gap is half of it a shell, and agrees with crush by length', () => {
		fc.assert(
			fc.property(number(0, 0.2), (gap) => {
				const read = value(crushFromGap(gap));
				const byLength = value(crushOf((Math.PI * 43) / 2 + gap / 2, 43));
				expect(read.crushMm).toBeCloseTo(byLength.crushMm, 5);
				expect(read.interferenceMm).toBeCloseTo(byLength.interferenceMm, 5);
			})
		);
		for (const odd of [-0.01, 3, NaN]) expect(crushFromGap(odd)).toMatchObject({ ok: false });
	});
	it('a ring’s gap goes back to what it was in the bore that it came from', () => {
		fc.assert(
			fc.property(number(0.2, 1), number(0, 0.2), (gap, wider) => {
				const there = value(ringGapInMm(gap, wider));
				expect(there).toBeGreaterThanOrEqual(gap - 1e-6);
				expect(value(ringGapInMm(there, -wider))).toBeCloseTo(gap, 5);
			})
		);
		const butts = ringGapInMm(0.1, -0.05);
		expect(butts.ok ? '' : butts.because).toContain('meet');
		expect(ringGapInMm(-0.1, 0)).toMatchObject({ ok: false });
		expect(ringGapInMm(0.3, NaN)).toMatchObject({ ok: false });
	});
});
