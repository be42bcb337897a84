import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	allowedOverMm,
	faceLines,
	facePoints,
	worstLine,
	type FaceGrid
} from '$lib/kernel/geometry/flatness';
import { abovePlaneMm, minimumZone, type FacePoint } from '$lib/kernel/geometry/minimum-zone';
import { heightsUnderEdge, largestGapMm } from '$lib/kernel/geometry/straight-edge';
import { straightness } from '$lib/kernel/geometry/straightness';
import { ofWeightedReadingsMm } from '$lib/kernel/geometry/weighted-readings';
import type { Outcome } from '$lib/kernel/outcome';
import { expectWithin, referenceOf } from '../../support/reference';

function value<T>(outcome: Outcome<T>): T {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
}
const micron = (most: number) => fc.integer({ min: -most, max: most }).map((one) => one / 1000);
/** Places on a grid of 10 mm, so that many lie in line; heights in whole micrometres, so that many tie. */
const place = fc.integer({ min: 0, max: 6 }).map((one) => one * 10);
const points = (least: number, most: number) =>
	fc
		.uniqueArray(fc.record({ xMm: place, yMm: place, zMm: micron(9) }), {
			minLength: least,
			maxLength: most,
			selector: ({ xMm, yMm }) => `${xMm} ${yMm}`
		})
		.filter((these) => minimumZone(these).ok);

/** Four readings at a time: the widest of all their zones is the zone of the whole. */
function byFours(these: readonly FacePoint[]): number {
	let widest = 0;
	const n = these.length;
	for (let i = 0; i < n; i++)
		for (let j = i + 1; j < n; j++)
			for (let k = j + 1; k < n; k++)
				for (let l = k + 1; l < n; l++) {
					const four = [these[i], these[j], these[k], these[l]] as FacePoint[];
					const weights = four.map((_, at) => {
						const [a, b, c] = four.filter((__, other) => other !== at) as [
							FacePoint,
							FacePoint,
							FacePoint
						];
						const area = (b.xMm - a.xMm) * (c.yMm - a.yMm) - (b.yMm - a.yMm) * (c.xMm - a.xMm);
						return at % 2 === 0 ? area : -area;
					});
					const sum = weights.reduce((total, one) => total + Math.abs(one), 0);
					if (sum === 0) continue;
					const off = four.reduce((total, one, at) => total + one.zMm * (weights[at] ?? 0), 0);
					widest = Math.max(widest, (2 * Math.abs(off)) / sum);
				}
	return widest;
}

describe('flatness of a face', () => {
	type Zone = FaceGrid & { leastSquaresMm: number };
	it.each(referenceOf<Zone>('flatness-zones.json'))('%s', (_, entry) => {
		const found = value(minimumZone(value(facePoints(entry))));
		expectWithin(found.widthMm, entry);
		// A plane laid by least squares says more, never less.
		expect(found.widthMm).toBeLessThanOrEqual(entry.leastSquaresMm + 1e-6);
	});
	it('is the widest zone of any four readings', () => {
		fc.assert(
			fc.property(points(4, 9), (these) => {
				expect(value(minimumZone(these)).widthMm).toBeCloseTo(byFours(these), 5);
			}),
			{ numRuns: 300 }
		);
	});
	it('holds every reading between its planes, and those it rests on say its width', () => {
		fc.assert(
			fc.property(points(4, 40), (these) => {
				const { widthMm, lower, held } = value(minimumZone(these));
				for (const one of these) {
					expect(abovePlaneMm(lower, one)).toBeGreaterThan(-1e-6);
					expect(abovePlaneMm(lower, one)).toBeLessThan(widthMm + 1e-6);
				}
				const sum = held.reduce(
					(total, { at, weight }) => total + weight * (these[at]?.zMm ?? 0),
					0
				);
				expect(sum).toBeCloseTo(widthMm, 5);
				expect(held.reduce((total, { weight }) => total + weight, 0)).toBeCloseTo(0, 9);
				expect(held.length).toBeLessThanOrEqual(4);
			})
		);
	});
	it('does not change with the tilt and the height at which the face lies, nor when it is turned over', () => {
		const tilt = fc.double({ min: -0.01, max: 0.01, noNaN: true });
		const lift = fc.double({ min: -20, max: 20, noNaN: true });
		fc.assert(
			fc.property(points(4, 25), tilt, tilt, lift, (these, perX, perY, up) => {
				const { widthMm } = value(minimumZone(these));
				const tilted = these.map((one) => ({
					...one,
					zMm: one.zMm + perX * one.xMm + perY * one.yMm + up
				}));
				expect(value(minimumZone(tilted)).widthMm).toBeCloseTo(widthMm, 5);
				const over = these.map((one) => ({ ...one, zMm: -one.zMm }));
				expect(value(minimumZone(over)).widthMm).toBeCloseTo(widthMm, 5);
			})
		);
	});
	it('does not depend on the order of the readings, nor on the unit', () => {
		fc.assert(
			fc.property(points(4, 20), (these) => {
				const { widthMm } = value(minimumZone(these));
				expect(value(minimumZone(these.toReversed())).widthMm).toBeCloseTo(widthMm, 5);
				const inInches = these.map(({ xMm, yMm, zMm }) => ({
					xMm: xMm / 25.4,
					yMm: yMm / 25.4,
					zMm: zMm / 25.4
				}));
				expect(value(minimumZone(inInches)).widthMm * 25.4).toBeCloseTo(widthMm, 4);
			})
		);
	});
	it('only grows when a reading is added', () => {
		fc.assert(
			fc.property(points(5, 20), (these) => {
				const fewer = minimumZone(these.slice(1));
				fc.pre(fewer.ok);
				expect(value(minimumZone(these)).widthMm).toBeGreaterThanOrEqual(
					value(fewer).widthMm - 1e-6
				);
			})
		);
	});
	it('refuses what is no face, and gives a number or a reason whatever is typed', () => {
		const line = [0, 1, 2, 3, 4].map((at) => ({ xMm: at * 10, yMm: at * 5, zMm: 0 }));
		expect(minimumZone(line)).toEqual({
			ok: false,
			because: 'the readings lie in one line: a face is read across as well'
		});
		expect(minimumZone(line.slice(0, 3)).ok).toBe(false);
		const anything = fc.record({ xMm: fc.double(), yMm: fc.double(), zMm: fc.double() });
		fc.assert(
			fc.property(fc.array(anything, { maxLength: 8 }), (these) => {
				const found = minimumZone(these);
				expect(found.ok ? Number.isFinite(found.value.widthMm) : found.because !== '').toBe(true);
			})
		);
	});
});

describe('straightness of a line', () => {
	const profile = fc.array(micron(50), { minLength: 3, maxLength: 12 }).map((heightMm) => ({
		atMm: heightMm.map((_, at) => at * 25),
		heightMm
	}));
	it('is the gap under a straight edge that rests on both ends', () => {
		expect(value(straightness({ atMm: [0, 60, 100], heightMm: [0, -0.05, 0] }))).toEqual({
			widthMm: 0.05,
			held: [0, 1, 2],
			weights: [0.4, -1, 0.6]
		});
	});
	it('is the sum of its three readings, each with its weight', () => {
		fc.assert(
			fc.property(profile, (line) => {
				const { widthMm, held, weights } = value(straightness(line));
				const sum = held.reduce(
					(total, at, one) => total + (weights[one] ?? NaN) * (line.heightMm[at] ?? NaN),
					0
				);
				expect(sum).toBeCloseTo(widthMm, 5);
			})
		);
	});
	it('does not change with the way that the straight edge rests', () => {
		const slope = fc.double({ min: -0.01, max: 0.01, noNaN: true });
		fc.assert(
			fc.property(profile, slope, micron(900), (line, per, up) => {
				const { widthMm } = value(straightness(line));
				const other = line.heightMm.map((one, at) => one + up + per * (line.atMm[at] ?? 0));
				expect(value(straightness({ ...line, heightMm: other })).widthMm).toBeCloseTo(widthMm, 5);
			})
		);
	});
	it('within a shorter stretch is never more, and over the whole length is the whole', () => {
		fc.assert(
			fc.property(profile, fc.integer({ min: 2, max: 11 }), (line, steps) => {
				const whole = value(straightness(line)).widthMm;
				const part = value(straightness(line, steps * 25));
				expect(part.widthMm).toBeLessThanOrEqual(whole);
				const [first, , last] = part.held;
				expect((line.atMm[last] ?? 0) - (line.atMm[first] ?? 0)).toBeLessThanOrEqual(steps * 25);
				expect(value(straightness(line, line.atMm.at(-1))).widthMm).toBe(whole);
			})
		);
	});
	it('tells a step that a long look hides', () => {
		const atMm = [0, 50, 100, 150, 200, 250, 300];
		const heightMm = [0, 0, 0.03, 0, 0, 0, 0];
		expect(value(straightness({ atMm, heightMm }, 100)).widthMm).toBe(0.03);
		const bowed = atMm.map((at) => 0.05 * (1 - ((at - 150) / 150) ** 2));
		const within = value(straightness({ atMm, heightMm: bowed }, 100)).widthMm;
		expect(value(straightness({ atMm, heightMm: bowed })).widthMm).toBe(0.05);
		expect(within).toBeCloseTo(0.05 / 9, 5);
	});
	it('says what is missing', () => {
		expect(straightness({ atMm: [0, 60, 120], heightMm: [0, 0, 0] }, 100)).toEqual({
			ok: false,
			because: 'no three readings lie within 100 mm: read at closer places'
		});
		expect(straightness({ atMm: [0, 60], heightMm: [0, 0] }).ok).toBe(false);
		expect(straightness({ atMm: [0, 60, 60], heightMm: [0, 0, 0] }).ok).toBe(false);
		expect(straightness({ atMm: [0, 60, 90], heightMm: [0, Number.NaN, 0] }).ok).toBe(false);
		expect(straightness({ atMm: [0, 60, 90], heightMm: [0, 0] }).ok).toBe(false);
		expect(straightness({ atMm: [0, 60, 90], heightMm: [0, 0, 0] }, 0).ok).toBe(false);
	});
});

describe('lines of a face', () => {
	const face: FaceGrid = {
		alongMm: [0, 50, 100, 150],
		acrossMm: [0, 40, 80],
		heightMm: [
			[0, 0.01, 0.01, 0],
			[0, null, 0.02, 0],
			[0, 0, 0, -0.06]
		]
	};
	it('are read along and across, and pass over a bore', () => {
		const both = value(faceLines(face, 'both'));
		// The second column has two readings left, which is no line.
		expect(both.map(({ runs, line }) => `${runs} ${line}`)).toEqual([
			'along 0',
			'along 1',
			'along 2',
			'across 0',
			'across 2',
			'across 3'
		]);
		expect(both[1]?.atMm).toEqual([0, 100, 150]);
		expect(value(worstLine(both)).line).toMatchObject({ runs: 'along', line: 2 });
		expect(value(worstLine(both)).widthMm).toBe(0.04);
		expect(value(worstLine(value(faceLines(face, 'along')), 100)).widthMm).toBe(0.03);
	});
	it('never depart more from straight than the face departs from flat', () => {
		const height = fc.option(micron(40), { freq: 5 });
		const grid = fc.array(fc.array(height, { minLength: 5, maxLength: 5 }), {
			minLength: 3,
			maxLength: 3
		});
		fc.assert(
			fc.property(grid, (heightMm) => {
				const drawn = { alongMm: [0, 60, 120, 180, 240], acrossMm: [0, 50, 100], heightMm };
				const whole = minimumZone(value(facePoints(drawn)));
				const worst = worstLine(value(faceLines(drawn, 'both')));
				fc.pre(whole.ok && worst.ok);
				expect(value(worst).widthMm).toBeLessThanOrEqual(value(whole).widthMm + 2e-6);
			})
		);
	});
	it('want as many places as readings', () => {
		expect(facePoints({ ...face, acrossMm: [0, 40] })).toEqual({
			ok: false,
			because: '3 rows are read, but 2 places across named'
		});
		expect(facePoints({ ...face, alongMm: [0, 50, 100] }).ok).toBe(false);
		expect(faceLines({ ...face, alongMm: [0, 50, 40, 150] }, 'both').ok).toBe(false);
		expect(worstLine([])).toEqual({ ok: false, because: 'no line holds three readings' });
		expect(worstLine(value(faceLines(face, 'both')), 30).ok).toBe(false);
	});
});

describe('feeler gaps', () => {
	it('are heights below the straight edge', () => {
		const gaps = [
			[0, 0.04, null, 0],
			[0.02, 0, 0, 0.05]
		];
		expect(value(heightsUnderEdge(gaps))).toEqual([
			[0, -0.04, null, 0],
			[-0.02, 0, 0, -0.05]
		]);
		expect(value(largestGapMm(gaps))).toBe(0.05);
	});
	it('cannot be below zero, nor be none at all', () => {
		for (const odd of [-0.01, Number.NaN, Infinity]) {
			expect(heightsUnderEdge([[0, odd]]).ok).toBe(false);
			expect(largestGapMm([[0, odd]]).ok).toBe(false);
		}
		expect(largestGapMm([[null]]).ok).toBe(false);
	});
	it('under an edge that rests on both ends are what the line departs from straight', () => {
		const gap = fc.integer({ min: 0, max: 60 }).map((one) => one / 1000);
		fc.assert(
			fc.property(gap, gap, (a, b) => {
				const line = { atMm: [0, 40, 80, 120], heightMm: [0, -a, -b, 0] };
				expect(value(straightness(line)).widthMm).toBeGreaterThanOrEqual(
					value(largestGapMm([[0, a, b, 0]])) - 1e-6
				);
			})
		);
	});
});

describe('the uncertainty of readings taken with weights', () => {
	it('of a difference of two is √2 times that of one, and grows with it', () => {
		const width = fc.integer({ min: 0, max: 50 }).map((one) => one / 1000);
		fc.assert(
			fc.property(width, (expanded) => {
				expect(value(ofWeightedReadingsMm([1, -1], expanded))).toBeCloseTo(Math.SQRT2 * expanded);
				expect(value(ofWeightedReadingsMm([1], expanded))).toBe(expanded);
			})
		);
		for (const odd of [-0.01, Number.NaN, Infinity])
			expect(ofWeightedReadingsMm([1, -1], odd).ok).toBe(false);
	});
});

describe('a limit by length', () => {
	type Entry = { asks: string; perInch: number; lengthIn: number };
	const allowed = referenceOf<Entry>('faces-and-runout.json').filter(
		([, one]) => one.asks === 'allowed'
	);
	it.each(allowed)('%s', (_, entry) => {
		// A limit in inches by the inch is the same figure in millimetres by the millimetre.
		const found = value(allowedOverMm(entry.perInch * 100, entry.lengthIn * 25.4));
		expectWithin(found / 25.4, entry);
	});
	it('refuses nonsense', () => {
		for (const odd of [-1, Number.NaN, Infinity]) {
			expect(allowedOverMm(odd, 100).ok).toBe(false);
			expect(allowedOverMm(0.05, odd).ok).toBe(false);
		}
	});
});
