import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import type { DataSheet } from '$lib/domain/data-sheets/schema';
import { dimensionOf, fastenerOf, patternOf } from '$lib/domain/data-sheets/value-of';
import { displacementCm3 } from '$lib/kernel/cylinder/displacement';
import { preloadN } from '$lib/kernel/fasteners/preload';
import { proofLoadN } from '$lib/kernel/fasteners/proof-load';
import { stressAreaMm2 } from '$lib/kernel/fasteners/stress-area';
import { travelMm } from '$lib/kernel/fasteners/turn';

/** Nut factors that bracket a lubrication: textbook and supplier tables, reference 04, K-a to K-k. */
function nutFactors(lubrication: string): { least: number; most: number } {
	if (/oiled/.test(lubrication)) return { least: 0.15, most: 0.2 };
	return { least: 0.18, most: 0.25 };
}

/** 0.2 % proof stress, ISO 898-1:2013, table 3. */
const yieldStressMPa = { '8.8': 640, '10.9': 940, '12.9': 1100 };

const { engines } = catalogue();
const build = (sheet: DataSheet, key: string) => {
	const found = dimensionOf(sheet, key)?.build;
	if (!found) throw new Error(`${sheet.code} gives no limits for ${key}`);
	return found;
};

/** Bore less what turns or slides in it: the clearances that the limits of both can give. */
const fits = [
	['crankpin.bearingBore', 'crankpin.diameter', 'crankpin.oilClearance'],
	['mainJournal.bearingBore', 'mainJournal.diameter', 'mainJournal.oilClearance'],
	['cylinder.bore', 'piston.diameter', 'piston.clearance'],
	['valve.inletGuide', 'valve.inletStem', 'valve.inletStemClearance']
] as const;

describe.each(engines.map((sheet) => [sheet.code, sheet] as const))('data sheet %s', (_, sheet) => {
	it.each(fits.filter(([, , clearance]) => dimensionOf(sheet, clearance)))(
		'gives for %s and %s exactly the clearances that it prints',
		(boreKey, pinKey, clearanceKey) => {
			const [bore, pin] = [build(sheet, boreKey), build(sheet, pinKey)];
			const clearance = build(sheet, clearanceKey);
			expect(clearance.least).toBeCloseTo(bore.least - pin.most, 6);
			expect(clearance.most).toBeCloseTo(bore.most - pin.least, 6);
		}
	);

	it('lets nothing run again that would be refused when building, and wears the right way', () => {
		for (const { key, build, runAgain } of sheet.dimensions) {
			if (!build || !runAgain) continue;
			const names = `${key}: to run again is wider than to build`;
			if (runAgain.most !== undefined)
				expect(runAgain.most, names).toBeGreaterThanOrEqual(build.most);
			if (runAgain.least !== undefined)
				expect(runAgain.least, names).toBeLessThanOrEqual(build.least);
		}
	});

	it('keeps a bolt that is fitted again below its proof load, even well oiled', () => {
		for (const bolt of sheet.fasteners) {
			if (bolt.yieldTightened) continue;
			const last = bolt.stages.at(-1);
			if (!last || !('torqueNm' in last)) throw new Error(`${bolt.key} ends in an angle`);
			const { diameterMm, pitchMm } = bolt.thread;
			const proof = proofLoadN(diameterMm, pitchMm, bolt.propertyClass);
			const preload = preloadN(last.torqueNm, nutFactors(bolt.lubrication).least, diameterMm);
			if (!proof.ok || !preload.ok) throw new Error(`${bolt.key} cannot be computed`);
			const share = preload.value / proof.value;
			expect(share, `${bolt.key} is loaded to ${share} of proof`).toBeLessThan(0.9);
		}
	});

	it('turns a yield-tightened bolt through yield, not far beyond, and says single use', () => {
		for (const bolt of sheet.fasteners.filter((one) => one.yieldTightened)) {
			const { diameterMm, pitchMm } = bolt.thread;
			const area = stressAreaMm2(diameterMm, pitchMm);
			const [first] = bolt.stages;
			if (!area.ok || !bolt.gripMm || !first || !('torqueNm' in first))
				throw new Error(`${bolt.key} is snugged first and says its grip`);
			const snug = preloadN(first.torqueNm, nutFactors(bolt.lubrication).least, diameterMm);
			if (!snug.ok) throw new Error(snug.because);
			const turned = bolt.stages.reduce(
				(sum, one) => sum + ('angleDeg' in one ? one.angleDeg : 0),
				0
			);
			// Steel, 205 GPa; clamped parts about three times as stiff as the bolt, in series with it.
			const stiffness = 0.75 * ((205_000 * area.value) / bolt.gripMm);
			const yieldN = area.value * yieldStressMPa[bolt.propertyClass];
			const beyondMm = (snug.value + travelMm(turned, pitchMm) * stiffness - yieldN) / stiffness;
			expect(snug.value, `${bolt.key} is only snugged first`).toBeLessThan(yieldN * 0.6);
			expect(beyondMm, `${bolt.key} does not reach yield`).toBeGreaterThan(0);
			expect(beyondMm / bolt.gripMm, `${bolt.key} is drawn too far`).toBeLessThan(0.01);
			expect(bolt.reuse).toMatch(/new each time/);
		}
	});

	it('prints orders that go from the middle outwards and never down one side', () => {
		for (const { key, bolts, printedOrder } of sheet.patterns) {
			if (!printedOrder) continue;
			const at = (id: string) => {
				const bolt = bolts.find((one) => one.id === id);
				if (!bolt) throw new Error(`${key} has no ${id}`);
				return bolt;
			};
			const first = Math.abs(at(printedOrder[0] ?? '').xMm);
			const last = Math.abs(at(printedOrder.at(-1) ?? '').xMm);
			expect(first, key).toBe(Math.min(...bolts.map((one) => Math.abs(one.xMm))));
			expect(last, key).toBe(Math.max(...bolts.map((one) => Math.abs(one.xMm))));
			expect(at(printedOrder[0] ?? '').yMm * at(printedOrder[1] ?? '').yMm, key).toBeLessThan(0);
		}
	});

	it('says of every value that it is invented', () => {
		for (const one of [...sheet.dimensions, ...sheet.fasteners])
			expect(one.source).toContain('invented for teaching');
	});
});

it('names the engines by what they sweep', () => {
	const sweeps = { 'av3-1150': 3, 'av4-2200d': 4 };
	for (const [key, cylinders] of Object.entries(sweeps)) {
		const sheet = engines.find((one) => one.key === key);
		if (!sheet) throw new Error(`no sheet ${key}`);
		const bore = dimensionOf(sheet, 'cylinder.bore')?.nominal ?? NaN;
		const stroke = dimensionOf(sheet, 'crankshaft.stroke')?.nominal ?? NaN;
		const named = Number(/-(\d+)/.exec(sheet.code)?.[1]);
		expect(Math.abs(displacementCm3(bore, stroke, cylinders) - named)).toBeLessThan(5);
	}
	const av3 = engines.find((one) => one.key === 'av3-1150');
	expect(av3 && fastenerOf(av3, 'crankpin.rodBolt')?.yieldTightened).toBe(true);
	expect(av3 && patternOf(av3, 'head.bolts')?.bolts).toHaveLength(8);
});
