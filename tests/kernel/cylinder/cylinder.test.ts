import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	compressionHeight,
	pistonDeck,
	pistonToHeadMm,
	rodLength
} from '$lib/kernel/cylinder/block-stack';
import { clearanceForCm3, compressionRatio, ratioOf } from '$lib/kernel/cylinder/compression-ratio';
import { solvePart, type SolvedPart } from '$lib/kernel/cylinder/solve-part';
import { compressionBalance } from '$lib/kernel/cylinder/compression-test';
import { discHeightMm, discVolumeCm3 } from '$lib/kernel/cylinder/disc-volume';
import { companions, firingsOf } from '$lib/kernel/cylinder/firing';
import { leakBand, leakPercent } from '$lib/kernel/cylinder/leak-down';
import { crankAngleAtDeg, liquidLock, pistonBelowTdcMm } from '$lib/kernel/cylinder/liquid-lock';
import { bucklingOf } from '$lib/kernel/cylinder/rod-buckling';
import { pistonForceN, pressureForForceMPa } from '$lib/kernel/cylinder/speed-and-power';
import { wetTest } from '$lib/kernel/cylinder/wet-test';
import type { Outcome } from '$lib/kernel/outcome';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const cylinders = fc.record({ boreMm: number(60, 120), strokeMm: number(50, 140) });
const partsOf = fc.record({
	chamberCm3: number(25, 80),
	gasketBoreMm: number(121, 130),
	gasketMm: number(0.5, 2),
	deckMm: number(-0.5, 1),
	crownCm3: number(-4, 20)
});

describe('a compression ratio', () => {
	it('comes back when the part solved for it is put in', () => {
		fc.assert(
			fc.property(
				cylinders,
				partsOf,
				fc.constantFrom<SolvedPart>('chamberCm3', 'gasketMm', 'deckMm', 'crownCm3'),
				number(6, 14),
				(cylinder, parts, part, wanted) => {
					const solved = solvePart(cylinder, parts, part, wanted);
					fc.pre(solved.ok);
					const again = value(
						compressionRatio(cylinder, { ...parts, [part]: value(solved).value })
					);
					expect(again.ratio / wanted).toBeCloseTo(1, 8);
				}
			)
		);
	});
	it('falls with every part that gives room, and is the same in inches', () => {
		fc.assert(
			fc.property(cylinders, partsOf, (cylinder, parts) => {
				const ratio = value(compressionRatio(cylinder, parts)).ratio;
				for (const more of [
					{ chamberCm3: 1 },
					{ gasketMm: 0.1 },
					{ deckMm: 0.1 },
					{ crownCm3: 1 }
				] as Partial<typeof parts>[]) {
					const [[key = 'chamberCm3', by = 0] = []] = Object.entries(more) as [
						keyof typeof parts,
						number
					][];
					expect(
						value(compressionRatio(cylinder, { ...parts, [key]: parts[key] + by })).ratio
					).toBeLessThan(ratio);
				}
				const scaled = compressionRatio(
					{ boreMm: cylinder.boreMm / 25.4, strokeMm: cylinder.strokeMm / 25.4 },
					{
						chamberCm3: parts.chamberCm3 / 25.4 ** 3,
						crownCm3: parts.crownCm3 / 25.4 ** 3,
						gasketBoreMm: parts.gasketBoreMm / 25.4,
						gasketMm: parts.gasketMm / 25.4,
						deckMm: parts.deckMm / 25.4
					}
				);
				expect(value(scaled).ratio / ratio).toBeCloseTo(1, 9);
			})
		);
	});
	it('and clearance volume are inverse', () => {
		fc.assert(
			fc.property(number(100, 3000), number(1.5, 25), (swept, ratio) => {
				expect(value(ratioOf(swept, value(clearanceForCm3(swept, ratio)))) / ratio).toBeCloseTo(
					1,
					9
				);
			})
		);
	});
	it.each([
		[{ crownCm3: -200 }, 'nothing is left above the piston'],
		[{ gasketBoreMm: 80 }, 'smaller than the cylinder'],
		[{ gasketMm: -1 }, 'not thinner than nothing'],
		[{ chamberCm3: NaN }, 'volumes, zero or more']
	])('%j is refused with the reason', (odd, because) => {
		const parts = { chamberCm3: 40, gasketBoreMm: 88, gasketMm: 1.2, deckMm: 0.1, crownCm3: 5 };
		const found = compressionRatio({ boreMm: 86, strokeMm: 86 }, { ...parts, ...odd });
		expect(found.ok ? '' : found.because).toContain(because);
	});
	it('cannot be had where the other parts already hold more room', () => {
		const parts = { chamberCm3: 0, gasketBoreMm: 88, gasketMm: 1.2, deckMm: 0.1, crownCm3: 60 };
		expect(solvePart({ boreMm: 86, strokeMm: 86 }, parts, 'chamberCm3', 10)).toMatchObject({
			ok: false
		});
		expect(solvePart({ boreMm: 86, strokeMm: 86 }, parts, 'gasketMm', 10)).toMatchObject({
			ok: false
		});
		expect(solvePart({ boreMm: 86, strokeMm: 86 }, parts, 'crownCm3', 1)).toMatchObject({
			ok: false
		});
	});
});

describe('a piston and its crank', () => {
	it('position and angle are inverse, from one dead centre to the other', () => {
		fc.assert(
			fc.property(number(50, 140), number(1.3, 3), number(1, 179), (stroke, ratio, angle) => {
				const rod = stroke * ratio;
				const below = value(pistonBelowTdcMm(stroke, rod, angle));
				expect(value(crankAngleAtDeg(stroke, rod, below))).toBeCloseTo(angle, 5);
				expect(below).toBeGreaterThan(0);
				expect(below).toBeLessThan(stroke);
			})
		);
		expect(value(pistonBelowTdcMm(86, 143, 180))).toBeCloseTo(86, 9);
	});
	it('is stopped by liquid sooner the more there is, and not at all by less than its clearance', () => {
		fc.assert(
			fc.property(number(0, 200), number(20, 80), number(60, 110), (liquid, clearance, bore) => {
				const found = value(liquidLock(liquid, clearance, bore));
				expect(found.locks).toBe(liquid >= clearance);
				expect(found.belowTdcMm > 0).toBe(liquid > clearance);
				expect(value(liquidLock(liquid + 5, clearance, bore)).belowTdcMm).toBeGreaterThanOrEqual(
					found.belowTdcMm
				);
			})
		);
	});
	it('force and pressure are inverse', () => {
		fc.assert(
			fc.property(number(0.01, 20), number(40, 150), (pressure, bore) => {
				expect(
					value(pressureForForceMPa(value(pistonForceN(pressure, bore)), bore)) / pressure
				).toBeCloseTo(1, 9);
			})
		);
	});
	it('rod and piston share the block between them', () => {
		fc.assert(
			fc.property(
				number(200, 260),
				number(-0.5, 1),
				number(60, 100),
				number(25, 45),
				(blockHeight, deck, stroke, height) => {
					const stack = { blockHeight, deck, stroke };
					expect(value(compressionHeight(stack, value(rodLength(stack, height))))).toBeCloseTo(
						height,
						9
					);
				}
			)
		);
		expect(rodLength({ blockHeight: 50, deck: 0, stroke: 100 }, 30)).toMatchObject({ ok: false });
	});
	it('stand where block, piston, rod and crank put them, and as far from the head as the gasket leaves', () => {
		fc.assert(
			fc.property(
				number(60, 100),
				number(25, 45),
				number(120, 160),
				number(-1, 1),
				(s, h, l, d) => {
					const blockHeight = d + h + l + s / 2;
					const deck = value(pistonDeck({ blockHeight, compressionHeight: h, rod: l, stroke: s }));
					expect(deck).toBeCloseTo(d, 9);
					expect(value(rodLength({ blockHeight, deck, stroke: s }, h))).toBeCloseTo(l, 9);
				}
			)
		);
		expect(value(pistonToHeadMm(1.2, -0.45))).toBeCloseTo(0.75, 9);
		expect(pistonToHeadMm(-1, 0)).toMatchObject({ ok: false });
	});
	it('a flat space has one height for its volume', () => {
		fc.assert(
			fc.property(number(-50, 50), number(40, 150), (height, diameter) => {
				expect(value(discHeightMm(value(discVolumeCm3(diameter, height)), diameter))).toBeCloseTo(
					height,
					9
				);
			})
		);
	});
	it('a rod gives way at the same load by both rules where they meet, sooner the longer it is', () => {
		const rod = { areaMm2: 250, yieldMPa: 550, modulusMPa: 206_000 };
		const { transition } = value(bucklingOf({ ...rod, slenderness: 10 }));
		const [under, over] = [transition * 0.999999, transition * 1.000001].map((slenderness) =>
			value(bucklingOf({ ...rod, slenderness }))
		);
		expect([under?.rule, over?.rule]).toEqual(['Johnson', 'Euler']);
		expect((under?.loadN ?? 0) / (over?.loadN ?? 1)).toBeCloseTo(1, 4);
		fc.assert(
			fc.property(number(1, 300), (slenderness) => {
				expect(value(bucklingOf({ ...rod, slenderness: slenderness * 1.01 })).loadN).toBeLessThan(
					value(bucklingOf({ ...rod, slenderness })).loadN
				);
			})
		);
	});
});

describe('firings', () => {
	it('make one whole cycle, whichever cylinder the order begins with', () => {
		const order = [1, 5, 3, 6, 2, 4];
		fc.assert(
			fc.property(fc.integer({ min: 0, max: 5 }), (turn) => {
				const turned = [...order.slice(turn), ...order.slice(0, turn)];
				const found = value(firingsOf([0, 120, 240, 240, 120, 0], turned, 'four-stroke'));
				expect(found.reduce((sum, one) => sum + one.toNextDeg, 0)).toBeCloseTo(720, 9);
				expect(found.map((one) => one.toNextDeg)).toEqual(Array(6).fill(120));
			})
		);
	});
	it('are uneven where the throws are: a two with both pistons going up together fires evenly, with pins apart not', () => {
		const gaps = (throws: number[]) =>
			value(firingsOf(throws, [1, 2], 'four-stroke')).map((one) => one.toNextDeg);
		expect(gaps([0, 0])).toEqual([360, 360]);
		expect(gaps([0, 180])).toEqual([180, 540]);
		expect(gaps([0, 270])).toEqual([270, 450]);
	});
	it('an engine of one fires once a cycle, and a two-stroke each turn', () => {
		expect(value(firingsOf([0], [1], 'four-stroke'))).toEqual([
			{ cylinder: 1, atDeg: 0, toNextDeg: 720 }
		]);
		expect(
			value(firingsOf([0, 240, 120], [1, 3, 2], 'two-stroke')).map((one) => one.toNextDeg)
		).toEqual([120, 120, 120]);
	});
	it.each([
		[[0, 180, 180, 0], [1, 3, 4], 'names 3 of 4'],
		[[0, 180, 180, 0], [1, 3, 4, 4], 'stands twice'],
		[[0, 180, 180, 0], [1, 3, 4, 5], 'no cylinder 5'],
		[[0, 180, 180, 0], [1, 4, 3, 2], 'cannot be fired'],
		[[], [], 'at least one']
	])('throws %j in order %j are refused with the reason', (throws, order, because) => {
		const found = firingsOf(throws, order, 'four-stroke');
		expect(found.ok ? '' : found.because).toContain(because);
	});
	it('three cylinders have no pairs', () => {
		expect(companions([1, 2, 3])).toMatchObject({ ok: false });
	});
});

describe('tests of a cylinder', () => {
	it('judge alike in any unit and find neighbours', () => {
		const found = value(compressionBalance([10, 7, 7.2, 10], '75-of-highest'));
		expect(found.low).toEqual([2, 3]);
		expect(found.neighbours).toEqual([[2, 3]]);
		fc.assert(
			fc.property(
				fc.array(number(4, 14), { minLength: 2, maxLength: 8 }),
				number(0.5, 2),
				(set, scale) => {
					const [a, b] = [set, set.map((one) => one * scale)].map((one) =>
						value(compressionBalance(one, '80-of-mean'))
					);
					expect(b?.lowestShare).toBeCloseTo(a?.lowestShare ?? NaN, 9);
					expect((b?.allowedBar ?? 0) / scale).toBeCloseTo(a?.allowedBar ?? NaN, 9);
				}
			)
		);
	});
	it('a spread of ten pounds is a spread of 0.69 bar', () => {
		expect(value(compressionBalance([8.5, 7.82], '10-psi-apart')).low).toEqual([]);
		expect(value(compressionBalance([8.5, 7.8], '10-psi-apart')).low).toEqual([2]);
		expect(value(compressionBalance([24, 18], '100-psi-apart')).low).toEqual([]);
	});
	it('a spoonful of oil points to rings, to valves, or to neither', () => {
		expect([1.3, 1.1, 1.0].map((wet) => value(wetTest(7, 7 * wet)).verdict)).toEqual([
			'rings',
			'unclear',
			'valves-or-gasket'
		]);
	});
	it('leakage grows as the gauge falls, and names its band', () => {
		fc.assert(
			fc.property(number(1, 10), number(0, 1), (input, share) => {
				expect(value(leakPercent(input, input * share))).toBeCloseTo(100 * (1 - share), 6);
			})
		);
		expect([5, 15, 26, 80].map((one) => value(leakBand(one)))).toEqual([
			{ words: 'good', suspect: false },
			{ words: 'worn, serviceable', suspect: false },
			{ words: 'needs work', suspect: true },
			{ words: 'far gone: strip it', suspect: true }
		]);
		for (const odd of [-1, 101, NaN]) expect(leakBand(odd)).toMatchObject({ ok: false });
	});
	it('an answer is a number or a reason, whatever is asked', () => {
		const any = fc.double();
		fc.assert(
			fc.property(any, any, any, any, any, (a, b, c, d, e) => {
				for (const found of [
					ratioOf(a, b),
					clearanceForCm3(a, b),
					pistonBelowTdcMm(a, b, c),
					crankAngleAtDeg(a, b, c),
					pistonForceN(a, b),
					pressureForForceMPa(a, b),
					leakPercent(a, b),
					discHeightMm(a, b),
					pistonToHeadMm(a, b),
					pistonDeck({ blockHeight: a, compressionHeight: b, rod: c, stroke: d })
				])
					expect(found.ok ? Number.isFinite(found.value) : found.because !== '').toBe(true);
				const ratio = compressionRatio(
					{ boreMm: a, strokeMm: b },
					{ chamberCm3: c, gasketBoreMm: d, gasketMm: e, deckMm: a, crownCm3: b }
				);
				if (ratio.ok) expect(Number.isFinite(ratio.value.ratio)).toBe(true);
				const parts = { chamberCm3: c, gasketBoreMm: d, gasketMm: e, deckMm: a, crownCm3: b };
				const solved = solvePart({ boreMm: a, strokeMm: b }, parts, 'deckMm', c);
				if (solved.ok) expect(Object.values(solved.value).every(Number.isFinite)).toBe(true);
				const lock = liquidLock(a, b, c);
				if (lock.ok) expect(Number.isFinite(lock.value.belowTdcMm + lock.value.roomCm3)).toBe(true);
				const rod = bucklingOf({ areaMm2: a, slenderness: b, yieldMPa: c, modulusMPa: d });
				if (rod.ok) expect(Number.isFinite(rod.value.loadN)).toBe(true);
			}),
			{ numRuns: 1000 }
		);
	});
});
