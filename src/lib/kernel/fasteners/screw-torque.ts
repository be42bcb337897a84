import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';
import { armsOf, type FrictionJoint } from './friction-arms';

/**
 * Tightening torque by the whole screw formula, lead and friction angle together.
 *
 * Formula: M = F · d2/2 · (l + µG/cos 30°) / (1 − µG · l/cos 30°) + F · µK · Dkm/2, l = P / (π · d2).
 * @param preload F, N @param joint as `torqueByFriction` @param pitchDiameterMm d2 where a book
 *   gives it; else that of the thread
 * @returns N·m
 * Source: power-screw formula of the textbooks (reference TP43).
 * @example screwTorqueNm(1000, { diameterMm: 10, pitchMm: 1.5, threadFriction: 0.15,
 *   headFriction: 0.15, bearingMeanMm: 13 }) // 2.0
 */
export function screwTorqueNm(
	preload: number,
	joint: FrictionJoint,
	pitchDiameterMm?: number
): Outcome<number> {
	if (!(preload > 0)) return cannot('a preload is a number above zero');
	const arms = armsOf(joint);
	if (!arms.ok) return arms;
	const d2 = pitchDiameterMm ?? arms.value.pitchDiameterMm;
	if (!(d2 > 0)) return cannot('a pitch diameter is a number above zero');
	const lead = joint.pitchMm / (Math.PI * d2);
	const friction = joint.threadFriction / Math.cos(Math.PI / 6);
	const thread = (d2 / 2) * ((lead + friction) / (1 - friction * lead));
	return computedNumber((preload * (thread + arms.value.head)) / 1000);
}
