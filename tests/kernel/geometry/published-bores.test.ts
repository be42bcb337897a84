import { describe, expect, it } from 'vitest';
import { outOfRoundMm, taperMm } from '$lib/kernel/geometry/diameter-grid';
import { ringGapGrowthMm } from '$lib/kernel/geometry/end-play';
import { fitOf, ofDiameter, usualOilClearanceMm } from '$lib/kernel/geometry/fit';
import { nextSize } from '$lib/kernel/geometry/next-size';
import { wearMm } from '$lib/kernel/geometry/wear';
import type { Outcome } from '$lib/kernel/outcome';
import { expectWithin, given, referenceOf, type Worked } from '../../support/reference';

const inch = 25.4;
function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}

/** The kernel's answer in inches, worked in millimetres as everywhere. */
function answerIn(entry: Worked): number {
	const mm = (name: string) => given(entry, name) * inch;
	const exact = (sizeMm: number) => ({ leastMm: sizeMm, mostMm: sizeMm });
	const sums: Record<string, () => number> = {
		G01: () => value(outOfRoundMm([[mm('Dx'), mm('Dy')]])),
		G02: () => value(taperMm([[mm('Dtop')], [mm('Dbot')]])),
		G03: () => value(wearMm('bore', mm('Dmax'), mm('Dstd'))),
		G04: () => value(outOfRoundMm([[mm('D1'), mm('D2')]])),
		G06: () => value(usualOilClearanceMm(mm('D'))),
		G09: () => value(ringGapGrowthMm(mm('dD'))),
		G10: () => mm('gmax') + value(ringGapGrowthMm(mm('dD'))),
		// Two feeler readings of one plane: the difference is what a taper of two depths is.
		G13: () => value(taperMm([[mm('top')], [mm('low')]])),
		G15: () => value(fitOf(exact(mm('guide')), exact(mm('stem')))).mostMm,
		G16: () => value(fitOf(exact(mm('guide')), exact(mm('stem')))).leastMm,
		// A pin worn just under standard: the first undersize is the printed one.
		G17: () => value(nextSize('journal', mm('std') - 0.001, mm('std'), [mm('u')], 0)).sizeMm,
		G18: () => value(ofDiameter(given(entry, 'k'), mm('D')))
	};
	const sum = sums[entry.id];
	if (!sum) throw new Error(`${entry.id} has no sum`);
	return sum() / inch;
}

describe('bores, journals and clearances, published values', () => {
	it.each(referenceOf<Worked>('bores-and-clearances.json'))('%s', (_, entry) => {
		// Results are rounded to the nanometre, which is 4e-8 in.
		const room = Math.max(entry.tolerance.value ?? 0, 4e-8);
		expectWithin(answerIn(entry), { ...entry, tolerance: { kind: 'absolute', value: room } });
	});
	// US Army TM 5-3805-262-34, p. 4-24: 0.010, 0.020 and 0.030 in under 2.748 in, low limits.
	it('G17 the three undersizes of that page follow one another as the pin is worn further', () => {
		const steps = [0.01, 0.02, 0.03].map((one) => one * inch);
		const sizes = [2.745, 2.735, 2.725].map((worn) =>
			(value(nextSize('journal', worn * inch, 2.748 * inch, steps, 0)).sizeMm / inch).toFixed(3)
		);
		expect(sizes).toEqual(['2.738', '2.728', '2.718']);
	});
});
