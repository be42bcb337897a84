/**
 * How far a bolt moves along its thread by an angle.
 *
 * Formula: s = P · α / 360°.
 * @param angleDeg degrees @param pitchMm mm a turn
 * @returns mm
 * Source: definition of pitch, ISO 5408.
 * @example travelMm(90, 1.25) // 0.3125
 */
export function travelMm(angleDeg: number, pitchMm: number): number {
	if (!(angleDeg >= 0) || !(pitchMm > 0) || !Number.isFinite(pitchMm * angleDeg))
		throw new RangeError('an angle and a pitch above zero');
	return (pitchMm * angleDeg) / 360;
}
