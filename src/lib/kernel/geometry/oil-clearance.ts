import { cannot, computed, type Outcome } from '../outcome';
import { readingsOf, tidy, type DiameterGrid } from './diameter-grid';

export type Clearance = { leastMm: number; mostMm: number; meanMm: number };

/**
 * Diametral oil clearance of a plain bearing: bearing bore with its shells in and the cap
 * tightened through every stage, measured square to the split, less the pin.
 *
 * Formula: least = smallest bore − largest pin; most = largest bore − smallest pin;
 * mean = mean bore − mean pin.
 * @param bore mm @param pin mm
 * @returns mm; "cannot be computed" where a reading is missing or the pin is larger than the bore
 * Source: definition; the least value as in NAVEDTRA 14075 (bore less journal). Checked against
 * the reference clearances in tests/reference/workshop.
 * @example oilClearance([[40.036]], [[39.996]]) // 0.040 least, most and mean
 */
export function oilClearance(bore: DiameterGrid, pin: DiameterGrid): Outcome<Clearance> {
	const bores = readingsOf(bore);
	if (!bores.ok) return cannot(`bearing bore: ${bores.because}`);
	const pins = readingsOf(pin);
	if (!pins.ok) return cannot(`pin: ${pins.because}`);
	const leastMm = tidy(Math.min(...bores.value) - Math.max(...pins.value));
	if (leastMm <= 0)
		return cannot('the pin measures as large as its bearing: check both readings and the zero');
	const mostMm = tidy(Math.max(...bores.value) - Math.min(...pins.value));
	return computed({ leastMm, mostMm, meanMm: tidy(mean(bores.value) - mean(pins.value)) });
}

function mean(values: readonly number[]): number {
	return values.reduce((sum, one) => sum + one, 0) / values.length;
}
