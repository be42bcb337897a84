import { describe, expect, it } from 'vitest';
import { coneStiffnessNPerMm } from '$lib/kernel/fasteners/joint-stiffness';
import { nutFactors, type Lubrication } from '$lib/kernel/fasteners/nut-factor';
import { sixLobeAcrossMm, sixLobeSockets, threadsOfSixLobe } from '$lib/kernel/fasteners/six-lobe';
import { inSeriesNPerMm } from '$lib/kernel/fasteners/stiffness';
import { strengthOf, type StrengthName } from '$lib/kernel/fasteners/strength';
import type { Outcome } from '$lib/kernel/outcome';
import { convert } from '$lib/kernel/quantity/units';
import { expectWithin, given, referenceOf, type Worked } from '../../support/reference';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}

type Stress = Worked & { strength: StrengthName; part: 'proof' | 'yield' | 'tensile' };

describe('strengths of classes and grades, published', () => {
	it.each(referenceOf<Stress>('fastener-strengths.json'))('%s', (_, entry) => {
		const inches = entry.unit === 'ksi';
		const found = value(strengthOf(entry.strength, given(entry, 'd') * (inches ? 25.4 : 1)));
		const stress = { proof: found.proofMPa, yield: found.yieldMPa, tensile: found.tensileMPa };
		const mpa = stress[entry.part];
		expectWithin(inches ? convert('pressure', mpa, 'MPa', 'psi') / 1000 : mpa, entry);
	});
	it.each(['4.6', '5.8', '8.8', '10.9', '12.9'] as const)(
		'PC-rule: the numbers of %s are a hundredth of its nominal strength and the yield ratio',
		(name) => {
			const [a = NaN, b = NaN] = name.split('.').map(Number);
			const { yieldMPa, tensileMPa } = value(strengthOf(name, 10));
			// Least strengths lie at the nominal ones or up to 5 % above.
			expect(tensileMPa / (a * 100)).toBeGreaterThanOrEqual(1);
			expect(tensileMPa / (a * 100)).toBeLessThanOrEqual(1.05);
			expect(yieldMPa / (a * b * 10)).toBeGreaterThanOrEqual(1);
			expect(yieldMPa / (a * b * 10)).toBeLessThanOrEqual(1.05);
		}
	);
});

describe('nut factors, published', () => {
	type Factor = Worked & { lubrication: Lubrication };
	it.each(referenceOf<Factor>('nut-factors.json'))('%s', (_, { id, lubrication, expected }) => {
		const { least, most } = nutFactors[lubrication];
		// K-g, a black finish without oil, is the one that drags more than the dry steel of the others.
		if (id === 'K-g') return expect(expected).toBeGreaterThan(most);
		expect(expected).toBeGreaterThanOrEqual(least);
		expect(expected).toBeLessThanOrEqual(most);
	});
});

describe('stiffness of clamped layers, published', () => {
	const entries = referenceOf<Worked>('joint-stiffness.json');
	const cone = (entry: Worked) => {
		const [ofMm, ofMPa] =
			entry.unit === 'kN/mm' ? [1, 1] : [25.4, convert('pressure', 1, 'psi', 'MPa') * 1e6];
		const mm = (name: string) => given(entry, name) * ofMm;
		return value(coneStiffnessNPerMm(mm('D'), mm('d'), mm('t'), given(entry, 'E') * ofMPa));
	};
	const layers = entries.filter(([, { id }]) => id !== 'FR6');
	it.each(layers)('%s', (_, entry) => {
		const kNPerMm = cone(entry) / 1000;
		expectWithin(
			entry.unit === 'kN/mm' ? kNPerMm : (convert('force', kNPerMm, 'kN', 'lbf') * 25.4) / 1e6,
			entry
		);
	});
	it.each(entries.filter(([, { id }]) => id === 'FR6'))('%s', (_, entry) => {
		const [a = NaN, b = NaN, c = NaN] = layers.slice(0, 3).map(([, layer]) => cone(layer));
		expectWithin(value(inSeriesNPerMm(value(inSeriesNPerMm(a, b)), c)) / 1000, entry);
	});
});

describe('external six-lobe sockets, published sizes', () => {
	it.each(referenceOf<Worked>('six-lobe-sockets.json'))('%s', (_, entry) => {
		const size = sixLobeAcrossMm(entry.id.replace('ES', 'E'));
		expectWithin(size ?? NaN, entry);
		// The inch column is cut to two places: it agrees within a quarter of a millimetre.
		expect(Math.abs((size ?? NaN) - given(entry, 'x') * 25.4)).toBeLessThan(0.25);
	});
	type Pairing = { thread: number; sockets: string[] };
	it.each(referenceOf<Pairing>('six-lobe-threads.json'))('%s', (_, { thread, sockets }) => {
		expect(sixLobeSockets(thread)).toEqual(sockets);
		for (const socket of sockets) expect(threadsOfSixLobe(socket)).toContain(thread);
	});
	it('none is made up where no table lists a size', () => {
		expect(sixLobeSockets(9)).toEqual([]);
		expect(threadsOfSixLobe('E99')).toEqual([]);
		expect(sixLobeAcrossMm('E99')).toBeUndefined();
	});
});
