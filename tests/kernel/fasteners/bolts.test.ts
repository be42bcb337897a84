import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assemblyPreloadN, strengthWhileTurned } from '$lib/kernel/fasteners/assembly-preload';
import { boltSections, roundOfAreaMm, weakestSection } from '$lib/kernel/fasteners/bolt-sections';
import { pitchOfMm, tabledAreaMm2 } from '$lib/kernel/fasteners/bolt-thread';
import { coneStiffnessNPerMm, jointOfConesNPerMm } from '$lib/kernel/fasteners/joint-stiffness';
import { middleNutFactor } from '$lib/kernel/fasteners/nut-factor';
import { clampLoadN, loadShare } from '$lib/kernel/fasteners/preload';
import { boltLoads, gradeLoads, threadLoads } from '$lib/kernel/fasteners/proof-load';
import { stagePlan, type Stage } from '$lib/kernel/fasteners/stage-plan';
import { leftToTurnDeg, turnedDeg } from '$lib/kernel/fasteners/stage-sequence';
import {
	seriesOf,
	standardPitchesMm,
	unifiedThreads
} from '$lib/kernel/fasteners/standard-pitches';
import { preloadOfStretchN, stretchMm } from '$lib/kernel/fasteners/stiffness';
import { strengthNames, strengthOf } from '$lib/kernel/fasteners/strength';
import { tightenByAngle } from '$lib/kernel/fasteners/torque-angle';
import { lastingStrain, yieldLoadN } from '$lib/kernel/fasteners/yield-load';
import type { Outcome } from '$lib/kernel/outcome';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('loads of a thread in a class or a grade', () => {
	it('rise from proof over yield to tensile, whatever the strength', () => {
		fc.assert(
			fc.property(fc.constantFrom(...strengthNames), number(7, 38), (name, diameterMm) => {
				const loads = value(threadLoads({ diameterMm, pitchMm: 1.25 }, name));
				expect(loads.proofN).toBeLessThan(loads.yieldN);
				expect(loads.yieldN).toBeLessThan(loads.tensileN);
			})
		);
	});
	it('are the same by either way of asking', () => {
		expect(threadLoads({ diameterMm: 10, pitchMm: 1.25 }, '10.9')).toEqual(
			boltLoads(10, 1.25, '10.9')
		);
		expect(threadLoads({ diameterMm: 12.7, threadsPerInch: 13 }, 'SAE 5')).toEqual(
			gradeLoads(0.5, 13, '5')
		);
	});
	it('hold the ends of a grade in inches that came through millimetres', () => {
		for (let sixteenths = 4; sixteenths <= 24; sixteenths += 1)
			expect(strengthOf('SAE 5', (sixteenths / 16) * 25.4).ok).toBe(true);
		expect(value(strengthOf('SAE 5', 25.4)).proofMPa).toBeGreaterThan(
			value(strengthOf('SAE 5', 25.5)).proofMPa
		);
		expect(strengthOf('SAE 8', 6).ok).toBe(false);
		expect(strengthOf('SAE 8', 39).ok).toBe(false);
		expect(strengthOf('8.8', Number.NaN).ok).toBe(false);
	});
	it('stand on an area rounded as its table has it', () => {
		expect(value(tabledAreaMm2({ diameterMm: 10, pitchMm: 1.25 }))).toBe(61.2);
		expect(value(tabledAreaMm2({ diameterMm: 12.7, threadsPerInch: 13 })) / 25.4 ** 2).toBeCloseTo(
			0.1419,
			9
		);
		expect(pitchOfMm({ diameterMm: 12.7, threadsPerInch: 20 })).toBeCloseTo(1.27, 12);
	});
});

describe('the pitches of the series', () => {
	it('fall from coarse to fine and can be cut', () => {
		for (let d = 1; d <= 24; d += 1) {
			const pitches = standardPitchesMm(d);
			expect(pitches).toEqual(pitches.toSorted((a, b) => b - a));
			for (const pitch of pitches)
				expect(value(tabledAreaMm2({ diameterMm: d, pitchMm: pitch }))).toBeGreaterThan(0);
		}
		for (let n = 4; n <= 16; n += 1) {
			const threads = unifiedThreads(n / 16);
			if (threads) expect(threads.fine).toBeGreaterThan(threads.coarse);
		}
	});
	it('are none for a thread that is of neither', () => {
		expect(seriesOf(10, 1.1)).toBeUndefined();
		expect(seriesOf(9.5, 1)).toBeUndefined();
		expect(unifiedThreads(0.3)).toBeUndefined();
		expect(unifiedThreads(Number.NaN)).toBeUndefined();
	});
});

describe('shares of what a bolt bears', () => {
	it('clamp load and share are inverse', () => {
		fc.assert(
			fc.property(number(0.01, 1), number(100, 1e6), (share, proofN) => {
				expect(value(loadShare(value(clampLoadN(share, proofN)), proofN))).toBeCloseTo(share, 9);
			})
		);
	});
	it('the middle nut factor misses to both sides alike', () => {
		fc.assert(
			fc.property(number(0.05, 0.3), number(0, 0.3), (least, wide) => {
				const middle = value(middleNutFactor({ least, most: least + wide }));
				expect(middle - least).toBeCloseTo(least + wide - middle, 9);
			})
		);
	});
});

describe('stretch', () => {
	it('and the load that it stands for are inverse, shank and thread', () => {
		fc.assert(
			fc.property(
				number(20, 200),
				number(20, 150),
				number(0.05, 0.95),
				number(10, 1e5),
				(grip, area, part, load) => {
					const sections = value(
						boltSections(grip, area, {
							lengthMm: grip * part,
							diameterMm: roundOfAreaMm(area) * 1.1
						})
					);
					expect(
						value(preloadOfStretchN(value(stretchMm(load, sections)), sections)) / load
					).toBeCloseTo(1, 9);
					expect(sections.reduce((sum, one) => sum + one.lengthMm, 0)).toBeCloseTo(grip, 9);
					expect(value(weakestSection(sections)).areaMm2).toBe(area);
				}
			)
		);
	});
	it('a waisted shank yields before its thread, and a thick one after', () => {
		const waisted = value(boltSections(80, 61.2, { lengthMm: 60, diameterMm: 7.5 }));
		expect(value(weakestSection(waisted)).lengthMm).toBe(60);
		const thick = value(boltSections(80, 61.2, { lengthMm: 60, diameterMm: 10 }));
		expect(value(weakestSection(thick)).lengthMm).toBe(20);
		expect(value(boltSections(80, 61.2, { lengthMm: 80, diameterMm: 10 }))).toHaveLength(1);
	});
	it('refuses a shank that is longer than what is stretched, and bolts of nothing', () => {
		expect(boltSections(80, 61.2, { lengthMm: 81, diameterMm: 10 }).ok).toBe(false);
		expect(boltSections(0, 61.2).ok).toBe(false);
		expect(weakestSection([]).ok).toBe(false);
	});
});

describe('a joint of cones', () => {
	const joint = fc.record({
		face: number(11, 40),
		bolt: number(4, 10),
		grip: number(5, 300),
		modulus: number(40_000, 220_000)
	});
	it('is softer the longer it is, and stiffer the wider its face', () => {
		fc.assert(
			fc.property(joint, ({ face, bolt, grip, modulus }) => {
				const k = value(jointOfConesNPerMm(face, bolt, grip, modulus));
				expect(value(jointOfConesNPerMm(face, bolt, grip * 1.1, modulus))).toBeLessThan(k);
				expect(value(jointOfConesNPerMm(face * 1.1, bolt, grip, modulus))).toBeGreaterThan(k);
				// Never softer than the straight sleeve that the face itself would make.
				const sleeve = (modulus * (Math.PI / 4) * (face ** 2 - bolt ** 2)) / grip;
				expect(k).toBeGreaterThan(sleeve);
			})
		);
	});
	it('of half the scale in all lengths is half as stiff: no unit is left inside', () => {
		fc.assert(
			fc.property(joint, ({ face, bolt, grip, modulus }) => {
				const whole = value(coneStiffnessNPerMm(face, bolt, grip, modulus));
				const half = value(coneStiffnessNPerMm(face / 2, bolt / 2, grip / 2, modulus));
				expect(half / whole).toBeCloseTo(0.5, 9);
			})
		);
	});
});

describe('strength while the wrench is on', () => {
	it('is what the permissible preload leaves of the plain one', () => {
		fc.assert(
			fc.property(number(5, 30), number(0.5, 2), number(0, 0.4), (d, pitch, friction) => {
				const left = value(strengthWhileTurned(d, pitch, friction));
				expect(left).toBeGreaterThan(0);
				expect(left).toBeLessThan(1);
				const plain = value(assemblyPreloadN(d, pitch, 940, friction, 1)) / left;
				expect(value(assemblyPreloadN(d, pitch, 940, friction)) / plain / left).toBeCloseTo(0.9, 9);
			})
		);
	});
	it('is less where a shank thinner than the thread carries', () => {
		expect(value(strengthWhileTurned(10, 1.25, 0.12, 7.5))).toBeLessThan(
			value(strengthWhileTurned(10, 1.25, 0.12))
		);
	});
});

describe('past yield', () => {
	const asked = {
		snugN: 15_000,
		angleDeg: 720,
		pitchMm: 1.25,
		boltNPerMm: 130_000,
		jointNPerMm: 390_000,
		yieldN: 40_000,
		hardening: 0.1
	};
	it('a line with hardening ends where the bolt parts', () => {
		expect(tightenByAngle({ ...asked, tensileN: 48_000 })).toMatchObject({
			ok: false,
			because: expect.stringContaining('parts') as string
		});
		expect(tightenByAngle({ ...asked, tensileN: 80_000 }).ok).toBe(true);
	});
	it('lasting strain is of the length that yields', () => {
		expect(value(lastingStrain(0.5, 50))).toBe(0.01);
		expect(value(yieldLoadN(61.2, 940, 0.9))).toBeCloseTo(0.9 * 57_528, 6);
		expect(yieldLoadN(61.2, 940, 1.1).ok).toBe(false);
		expect(lastingStrain(-1, 50).ok).toBe(false);
	});
});

describe('a stage plan against proof load', () => {
	const bolt = {
		diameterMm: 10,
		pitchMm: 1.25,
		propertyClass: '8.8',
		nutFactor: { least: 0.15, most: 0.2 }
	} as const;
	const stages: Stage[] = [{ torqueNm: 30 }, { torqueNm: 60 }];
	it('tells which stage passes it: 61.2 mm² · 580 N/mm² = 35.5 kN, 60 / 0.0015 = 40 kN', () => {
		const plan = value(stagePlan({ ...bolt, stages }));
		expect(plan.stages.map((one) => one.beyondProof)).toEqual([false, true]);
		expect(plan.stages.map((one) => one.beyondYield)).toEqual([false, true]);
	});
	it('is refused for a bolt that is not yield-tightened, and taken for one that is', () => {
		const refused = stagePlan({ ...bolt, stages, yieldTightened: false });
		expect(refused).toEqual({ ok: false, because: 'stage 2 takes the bolt past its proof load' });
		expect(stagePlan({ ...bolt, stages, yieldTightened: true }).ok).toBe(true);
	});
});

describe('what is left to turn', () => {
	it('and what is turned make the whole, and more than the whole is refused', () => {
		const angles = fc.array(fc.integer({ min: 15, max: 120 }), { minLength: 1, maxLength: 4 });
		fc.assert(
			fc.property(angles, number(0, 1), (degrees, part) => {
				const stages = [{ torqueNm: 30 }, ...degrees.map((angleDeg) => ({ angleDeg }))];
				const all = turnedDeg(stages);
				expect(value(leftToTurnDeg(stages, part * all)) + part * all).toBeCloseTo(all, 9);
				expect(leftToTurnDeg(stages, all + 1).ok).toBe(false);
			})
		);
	});
});

describe('nonsense', () => {
	it('gets a reason or a number, never NaN', () => {
		const any = fc.double();
		fc.assert(
			fc.property(any, any, any, any, (a, b, c, d) => {
				for (const found of [
					clampLoadN(a, b),
					loadShare(a, b),
					middleNutFactor({ least: a, most: b }),
					preloadOfStretchN(a, [{ lengthMm: b, areaMm2: c }], d),
					coneStiffnessNPerMm(a, b, c, d),
					jointOfConesNPerMm(a, b, c, d),
					strengthWhileTurned(a, b, c, d),
					yieldLoadN(a, b, c),
					lastingStrain(a, b),
					leftToTurnDeg([{ angleDeg: a }], b),
					tabledAreaMm2({ diameterMm: a, threadsPerInch: b })
				])
					expect(found.ok ? Number.isFinite(found.value) : found.because.length > 0).toBe(true);
				const sections = boltSections(a, b, { lengthMm: c, diameterMm: d });
				if (sections.ok)
					for (const one of sections.value) expect(Number.isFinite(one.areaMm2)).toBe(true);
			}),
			{ numRuns: 1000 }
		);
	});
});
