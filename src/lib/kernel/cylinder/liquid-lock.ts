import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';

export type LiquidLock = {
	/** Whether the liquid stops the piston before top dead centre. */
	locks: boolean;
	/** What still goes in beside it, cm³; below zero it is too much by that. */
	roomCm3: number;
	/** How far below top dead centre the piston is stopped, mm; 0 where it is not. */
	belowTdcMm: number;
};

/**
 * Where a trapped liquid stops a piston. Oil, water and fuel do not give way: at or above the
 * clearance volume, something bends.
 *
 * Formula: x = (q − Vc) / (π/4 · B²).
 * @param liquidCm3 q, cm³, zero or more @param clearanceCm3 Vc, cm³, above zero @param boreMm B, mm
 * @returns whether it locks, the room left in cm³ and the distance below top dead centre in mm
 * Source: volume of a cylinder; reference entries D13 to D15.
 * @example liquidLock(80, 52.63, 86) // locks 4.71 mm below top dead centre
 */
export function liquidLock(
	liquidCm3: number,
	clearanceCm3: number,
	boreMm: number
): Outcome<LiquidLock> {
	if (!(liquidCm3 >= 0)) return cannot('a volume of liquid is zero or more');
	if (!(clearanceCm3 > 0) || !(boreMm > 0))
		return cannot('clearance volume and bore are numbers above zero');
	const roomCm3 = clearanceCm3 - liquidCm3;
	const below = computedNumber((Math.max(0, -roomCm3) * 1000) / ((Math.PI / 4) * boreMm ** 2));
	if (!below.ok) return below;
	if (!Number.isFinite(roomCm3)) return cannot('the volumes are no numbers');
	return computed({ locks: roomCm3 <= 0, roomCm3, belowTdcMm: below.value });
}

/**
 * How far the piston stands below top dead centre at a crank angle.
 *
 * Formula: x = r + L − r · cos φ − √(L² − r² · sin² φ), r = S/2.
 * @param strokeMm S, mm @param rodMm L, centre to centre, mm, above half the stroke
 * @param crankDeg φ after or before top dead centre, degrees
 * @returns mm
 * Source: geometry of the crank, any textbook of engine mechanics.
 * @example pistonBelowTdcMm(86, 143, 90) // 49.6
 */
export function pistonBelowTdcMm(
	strokeMm: number,
	rodMm: number,
	crankDeg: number
): Outcome<number> {
	const r = strokeMm / 2;
	if (!(r > 0) || !(rodMm > r)) return cannot('a rod is longer than half the stroke');
	if (!Number.isFinite(crankDeg)) return cannot('a crank angle is a number');
	const angle = (crankDeg * Math.PI) / 180;
	return computedNumber(
		r + rodMm - r * Math.cos(angle) - Math.sqrt(rodMm ** 2 - (r * Math.sin(angle)) ** 2)
	);
}

/**
 * Crank angle from top dead centre at which the piston stands a distance below it: the same rule
 * turned round.
 *
 * Formula: cos φ = (r² + (r + L − x)² − L²) / (2 · r · (r + L − x)), r = S/2.
 * @param belowMm x, mm, from 0 to the stroke
 * @returns degrees, 0 to 180
 * Source: cosine rule on crank, rod and centre line.
 * @example crankAngleAtDeg(86, 143, 4.71) // 24.4
 */
export function crankAngleAtDeg(strokeMm: number, rodMm: number, belowMm: number): Outcome<number> {
	const r = strokeMm / 2;
	if (!(r > 0) || !(rodMm > r)) return cannot('a rod is longer than half the stroke');
	if (!(belowMm >= 0) || belowMm > strokeMm)
		return cannot('the piston stands between its two dead centres');
	const reach = r + rodMm - belowMm;
	const cos = (r ** 2 + reach ** 2 - rodMm ** 2) / (2 * r * reach);
	return computedNumber((Math.acos(Math.min(1, Math.max(-1, cos))) * 180) / Math.PI);
}
