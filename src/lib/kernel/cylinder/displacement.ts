/**
 * Swept volume.
 *
 * Formula: V = n · π/4 · B² · S.
 * @param boreMm mm @param strokeMm mm @param cylinders whole number
 * @returns cm³
 * Source: definition; NAVEDTRA 14075.
 * @example displacementCm3(74, 89.1, 3) // 1149.6
 */
export function displacementCm3(boreMm: number, strokeMm: number, cylinders = 1): number {
	if (!(boreMm > 0) || !(strokeMm > 0) || !Number.isInteger(cylinders) || cylinders < 1)
		throw new RangeError('bore, stroke and a whole number of cylinders');
	const volumeMm3 = (Math.PI / 4) * boreMm ** 2 * strokeMm * cylinders;
	if (!Number.isFinite(volumeMm3)) throw new RangeError('no engine is that large');
	return volumeMm3 / 1000;
}
