import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/**
 * Mean piston speed.
 *
 * Formula: v = 2 · S · n / 60.
 * @param strokeMm S, mm @param speedPerMin n, revolutions a minute
 * @returns m/s
 * Source: definition; reference entry D05.
 * @example meanPistonSpeedMPerS(89.1, 5200) // 15.4
 */
export function meanPistonSpeedMPerS(strokeMm: number, speedPerMin: number): Outcome<number> {
	if (!(strokeMm > 0) || !(speedPerMin >= 0))
		return cannot('stroke and speed are numbers, the stroke above zero');
	return computedNumber((2 * strokeMm * speedPerMin) / 60_000);
}

/**
 * Power of a shaft from its torque and speed.
 *
 * Formula: P = 2π · M · n / 60.
 * @param torqueNm M, N·m @param speedPerMin n, revolutions a minute
 * @returns kW
 * Source: definition; reference entries U25 and U26.
 * @example powerKw(250, 4000) // 104.72
 */
export function powerKw(torqueNm: number, speedPerMin: number): Outcome<number> {
	if (!(torqueNm >= 0) || !(speedPerMin >= 0))
		return cannot('torque and speed are numbers, zero or more');
	return computedNumber((2 * Math.PI * torqueNm * speedPerMin) / 60_000);
}

/**
 * Force of a pressure on a piston: what a leak test, a lock or a peak pressure pushes with.
 *
 * Formula: F = p · π/4 · B².
 * @param pressureMPa p, MPa, zero or more @param boreMm B, mm
 * @returns N
 * Source: definition; reference entries B04 and C18.
 * @example pistonForceN(0.5516, 86.36) // 3231
 */
export function pistonForceN(pressureMPa: number, boreMm: number): Outcome<number> {
	if (!(pressureMPa >= 0) || !(boreMm > 0))
		return cannot('pressure and bore are numbers, the bore above zero');
	return computedNumber((pressureMPa * Math.PI * boreMm ** 2) / 4);
}

/**
 * Pressure at which a piston pushes with a force: the same rule turned round.
 *
 * Formula: p = F / (π/4 · B²).
 * @param forceN F, N, zero or more @param boreMm B, mm
 * @returns MPa
 * Source: as `pistonForceN`.
 * @example pressureForForceMPa(136_100, 86) // 23.4
 */
export function pressureForForceMPa(forceN: number, boreMm: number): Outcome<number> {
	if (!(forceN >= 0) || !(boreMm > 0))
		return cannot('force and bore are numbers, the bore above zero');
	return computedNumber(forceN / ((Math.PI / 4) * boreMm ** 2));
}
