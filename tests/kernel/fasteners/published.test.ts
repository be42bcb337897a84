import { describe, expect, it } from 'vitest';
import { assemblyPreloadN } from '$lib/kernel/fasteners/assembly-preload';
import { torqueByFriction } from '$lib/kernel/fasteners/friction';
import { screwTorqueNm } from '$lib/kernel/fasteners/screw-torque';
import { clampLoadN, torqueForPreloadNm } from '$lib/kernel/fasteners/preload';
import { boltLoads, gradeLoads, loadsOf } from '$lib/kernel/fasteners/proof-load';
import { stagePlan } from '$lib/kernel/fasteners/stage-plan';
import { stretchMm } from '$lib/kernel/fasteners/stiffness';
import type { Grade, PropertyClass } from '$lib/kernel/fasteners/strength';
import { seriesOf, unifiedThreads } from '$lib/kernel/fasteners/standard-pitches';
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
	return lbf(value(gradeLoads(inch(name), Number(threads), of429 as Grade)).proofN);
}

describe('threads and what they bear, published tables', () => {
	const entries = referenceOf<Worked>('threads-and-strength.json');
	it.each(entries)('%s', (_, entry) => {
		expectWithin(threadOrLoad(entry), entry);
	});
	it.each(entries.filter(([, { id }]) => id.startsWith('TH')))('%s: its series', (_, entry) => {
		const series = seriesOf(given(entry, 'd'), given(entry, 'P'));
		expect(series).toBe(entry.quantity.endsWith('fine') ? 'fine' : 'coarse');
	});
	it.each(entries.filter(([, { id }]) => id.startsWith('UN')))('%s: its series', (_, entry) => {
		const threads = unifiedThreads(given(entry, 'd'));
		expect([threads?.coarse, threads?.fine]).toContain(given(entry, 'n'));
	});
});

/** What an area bears at a stress, by the book's own figures. */
const bears = (areaIn2: number, psi: number) =>
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
		return value(clampLoadN(0.75, value(boltLoads(10, 1.5, '10.9')).proofN)) / 1000;
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
	if (!has('K')) return lbf(value(clampLoadN(0.75, bears(of('At'), of('Sp')))));
	const load = has('F') ? newtons(of('F')) : bears(of('At'), of('s'));
	const torque = value(torqueForPreloadNm(load, of('K'), of('D') * 25.4));
	return entry.unit === 'lbf.ft' ? lbfFt(torque) : lbfIn(torque);
}

describe('torque and preload, published values', () => {
	it.each(referenceOf<Worked>('torque-and-preload.json'))('%s', (_, entry) => {
		expectWithin(torqueOrPreload(entry), entry);
	});
});
