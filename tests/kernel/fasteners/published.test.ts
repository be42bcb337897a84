import { describe, expect, it } from 'vitest';
import { assemblyPreloadN } from '$lib/kernel/fasteners/assembly-preload';
import { screwTorqueNm, torqueByFriction } from '$lib/kernel/fasteners/friction';
import { torqueForPreloadNm } from '$lib/kernel/fasteners/preload';
import { boltLoads, loadsOf } from '$lib/kernel/fasteners/proof-load';
import { sixLobeAcrossMm, sixLobeSockets, threadsOfSixLobe } from '$lib/kernel/fasteners/six-lobe';
import { stagePlan } from '$lib/kernel/fasteners/stage-plan';
import { stretchMm } from '$lib/kernel/fasteners/stiffness';
import {
	classStrength,
	gradeStrength,
	type Grade,
	type PropertyClass
} from '$lib/kernel/fasteners/strength';
import { stressAreaIn2, stressAreaMm2 } from '$lib/kernel/fasteners/stress-area';
import type { Outcome } from '$lib/kernel/outcome';
import { convert } from '$lib/kernel/quantity/units';
import { expectWithin, given, referenceOf, type Worked } from '../../support/reference';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}
const coarse: Record<string, number> = {
	M6: 1,
	M8: 1.25,
	M10: 1.5,
	M12: 1.75,
	M14: 2,
	M16: 2,
	M18: 2.5,
	M20: 2.5,
	M24: 3
};
const inch = (text: string) =>
	text
		.split('_')
		.map(Number)
		.reduce((over, under) => over / under);
const lbf = (newtons: number) => convert('force', newtons, 'N', 'lbf');
const lbfFt = (torqueNm: number) => convert('torque', torqueNm, 'N·m', 'lbf·ft');
const lbfIn = (torqueNm: number) => convert('torque', torqueNm, 'N·m', 'lbf·in');
const newtons = (force: number) => convert('force', force, 'lbf', 'N');
/** Stress of a book's figure in psi. */
const mpa = (psi: number) => convert('pressure', psi, 'psi', 'MPa');
const mm2 = (in2: number) => in2 * 25.4 ** 2;

/** The kernel's answer for an entry of the table of threads and strengths. */
function threadOrLoad(entry: Worked): number {
	const of = (name: string) => given(entry, name);
	const [kind = '', size = '', grade = ''] = entry.id.split(/-(?=M|\d|[0-9.]+$)/);
	if (kind === 'TH') return value(stressAreaMm2(of('d'), of('P')));
	if (kind === 'UN') return value(stressAreaIn2(of('d'), of('n')));
	if (kind === 'PL' || kind === 'TL') {
		const pitch = coarse[size] ?? NaN;
		const loads = value(boltLoads(Number(size.slice(1)), pitch, grade as PropertyClass));
		return (kind === 'PL' ? loads.proofN : loads.tensileN) / 1000;
	}
	const [, name = '', threads = '', of429 = ''] = /^UPL-([\d_]+)-(\d+)-(\d)$/.exec(entry.id) ?? [];
	const diameterIn = inch(name);
	// The published areas are rounded to four places before they are multiplied.
	const area = Number(value(stressAreaIn2(diameterIn, Number(threads))).toFixed(4));
	const strength = value(gradeStrength(of429 as Grade, diameterIn));
	return lbf(value(loadsOf(mm2(area), strength)).proofN);
}

describe('threads and what they bear, published tables', () => {
	it.each(referenceOf<Worked>('threads-and-strength.json'))('%s', (_, entry) => {
		expectWithin(threadOrLoad(entry), entry);
	});
});

/** Clamp load at a share of a stress, by the book's area. */
const share = (part: number, areaIn2: number, psi: number) =>
	part *
	value(loadsOf(mm2(areaIn2), { proofMPa: mpa(psi), yieldMPa: mpa(psi), tensileMPa: mpa(psi) }))
		.proofN;

/** The kernel's answer for an entry of the table of torques and preloads. */
function torqueOrPreload(entry: Worked): number {
	const of = (name: string) => given(entry, name);
	const has = (name: string) => name in entry.inputs;
	const { id } = entry;
	const joint = () => ({
		diameterMm: Number(/M(\d+)/.exec(entry.quantity)?.[1] ?? (has('d') ? of('d') : 10)),
		pitchMm: of('P'),
		threadFriction: of('mu'),
		headFriction: of('mu'),
		bearingMeanMm: of('Dkm')
	});
	if (id.startsWith('VD-T')) return value(torqueByFriction(of('F') * 1000, joint())).torqueNm;
	if (id.startsWith('VD-F'))
		return value(assemblyPreloadN(of('d'), of('P'), of('Rp'), of('mu'))) / 1000;
	if (id === 'VD-S1') return 100 * value(torqueByFriction(1, joint())).shares.pitch;
	if (id === 'VD-S3') return 100 * value(torqueByFriction(1, joint())).shares.head;
	if (id === 'VD-S4') return value(torqueByFriction(1, joint())).nutFactor;
	if (id === 'TP43') {
		const diameterMm = of('d') * 25.4;
		const torque = screwTorqueNm(
			newtons(of('F')),
			{
				diameterMm,
				pitchMm: 25.4 / of('N'),
				threadFriction: of('mu'),
				headFriction: of('mu'),
				bearingMeanMm: of('dc_over_d') * diameterMm
			},
			of('dm') * 25.4
		);
		return lbfIn(value(torque));
	}
	if (id === 'TN5')
		return value(stretchMm(of('F'), [{ lengthMm: of('L'), areaMm2: of('A') }], of('E')));
	if (id === 'TN9') {
		const loads = value(boltLoads(10, 1.5, '10.9'));
		return (0.75 * loads.proofN) / 1000;
	}
	if (id === 'TN6') {
		const angles = ['a1', 'a2', 'a3', 'a4'].map((name) => ({ angleDeg: of(name) }));
		const plan = value(
			stagePlan({
				diameterMm: 12,
				pitchMm: 1.75,
				propertyClass: '10.9',
				nutFactor: { least: 0.15, most: 0.2 },
				gripMm: 120,
				stages: [{ torqueNm: 40 }, ...angles]
			})
		);
		return plan.stages.reduce(
			(sum, { stage }) => sum + ('angleDeg' in stage ? stage.angleDeg : 0),
			0
		);
	}
	if (!has('K')) return lbf(share(0.75, of('At'), of('Sp')));
	const load = has('F') ? newtons(of('F')) : share(1, of('At'), of('s'));
	const torque = value(torqueForPreloadNm(load, of('K'), of('D') * 25.4));
	return entry.unit === 'lbf.ft' ? lbfFt(torque) : lbfIn(torque);
}

describe('torque and preload, published values', () => {
	it.each(referenceOf<Worked>('torque-and-preload.json'))('%s', (_, entry) => {
		expectWithin(torqueOrPreload(entry), entry);
	});
});

describe('external six-lobe sockets, published sizes', () => {
	it.each(referenceOf<Worked>('six-lobe-sockets.json'))('%s', (_, entry) => {
		const size = sixLobeAcrossMm(entry.id.replace('ES', 'E'));
		expectWithin(size ?? NaN, entry);
		// The inch column is cut to two places: it agrees within a quarter of a millimetre.
		expect(Math.abs((size ?? NaN) - given(entry, 'x') * 25.4)).toBeLessThan(0.25);
	});
	it('are found from the thread and back, and none is made up', () => {
		for (const thread of [5, 6, 8, 10, 12, 14, 16])
			for (const socket of sixLobeSockets(thread))
				expect(threadsOfSixLobe(socket)).toContain(thread);
		expect(sixLobeSockets(9)).toEqual([]);
		expect(threadsOfSixLobe('E99')).toEqual([]);
		expect(sixLobeAcrossMm('E99')).toBeUndefined();
	});
});

describe('strengths of classes and grades, published', () => {
	// Source: ISO 898-1:2013, table 3, seen in two supplier copies (references PC-4.6 to PC-12.9).
	it.each([
		['4.6', 10, 225, 240, 400],
		['5.8', 10, 380, 420, 520],
		['8.8', 16, 580, 640, 800],
		['8.8', 18, 600, 660, 830],
		['10.9', 10, 830, 940, 1040],
		['12.9', 10, 970, 1100, 1220]
	] as const)('PC-%s at M%s', (name, diameter, proofMPa, yieldMPa, tensileMPa) => {
		expect(classStrength(name, diameter)).toEqual({ proofMPa, yieldMPa, tensileMPa });
	});
	// Source: SAE J429, strengths by size (references J429-1 to J429-8).
	it.each([
		['1', 0.5, 33, 36, 60],
		['2', 0.75, 55, 57, 74],
		['2', 0.875, 33, 36, 60],
		['5', 1, 85, 92, 120],
		['5', 1.25, 74, 81, 105],
		['8', 0.5, 120, 130, 150]
	] as const)('J429-%s at %s in', (grade, diameter, proof, least, tensile) => {
		const found = value(gradeStrength(grade, diameter));
		expect(convert('pressure', found.proofMPa, 'MPa', 'psi')).toBeCloseTo(proof * 1000, 6);
		expect(convert('pressure', found.yieldMPa, 'MPa', 'psi')).toBeCloseTo(least * 1000, 6);
		expect(convert('pressure', found.tensileMPa, 'MPa', 'psi')).toBeCloseTo(tensile * 1000, 6);
	});
});
