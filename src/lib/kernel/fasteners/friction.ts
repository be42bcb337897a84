import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import { armsOf, type Arms, type FrictionJoint } from './friction-arms';

export type TorqueSplit = {
	torqueNm: number;
	/** Shares of the torque: what stretches the bolt, and what the two frictions eat. Together 1. */
	shares: { pitch: number; thread: number; head: number };
	/** The nut factor that would give the same torque. */
	nutFactor: number;
	/** What each part of the sum takes for one newton, mm. */
	arms: Arms;
};

/**
 * Mean diameter of the ring on which a head or nut turns.
 *
 * Formula: Dkm = (dw + dh) / 2.
 * @param outerMm outer diameter of the bearing face, mm @param holeMm hole, mm, smaller
 * @returns mm
 * Source: VDI 2230 part 1, mean bearing diameter as the published torque tables take it.
 * @example bearingMeanMm(14.6, 11) // 12.8
 */
export function bearingMeanMm(outerMm: number, holeMm: number): Outcome<number> {
	if (!(holeMm > 0) || !(outerMm > holeMm)) return cannot('the face is wider than its hole');
	return computedNumber((outerMm + holeMm) / 2);
}

/**
 * Tightening torque for a preload by thread and head friction, and where it goes.
 *
 * Formula: M = F · (0.16 P + 0.58 d2 µG + Dkm/2 · µK).
 * @param preload wanted preload F, N, above zero @param joint sizes in mm, frictions as bare numbers
 * @returns N·m, shares and the nut factor M / (F · d) of this very joint
 * Source: VDI 2230 part 1, tightening torque.
 * @example torqueByFriction(46_400, { diameterMm: 10, pitchMm: 1.25, threadFriction: 0.12,
 *   headFriction: 0.12, bearingMeanMm: 12.8 }) // 74.6 N·m, of it 12.4 % for the bolt
 */
export function torqueByFriction(preload: number, joint: FrictionJoint): Outcome<TorqueSplit> {
	if (!(preload > 0)) return cannot('a preload is a number above zero');
	const arms = armsOf(joint);
	if (!arms.ok) return arms;
	const { pitch, thread, head, all } = arms.value;
	const torque = computedNumber((preload * all) / 1000);
	if (!torque.ok) return torque;
	return computed({
		torqueNm: torque.value,
		shares: { pitch: pitch / all, thread: thread / all, head: head / all },
		nutFactor: all / joint.diameterMm,
		arms: arms.value
	});
}

/**
 * Preload that a torque gives by thread and head friction: the same rule turned round.
 *
 * Formula: F = M / (0.16 P + 0.58 d2 µG + Dkm/2 · µK).
 * @param torqueNm N·m, above zero @param joint as `torqueByFriction`
 * @returns N
 * Source: as `torqueByFriction`.
 * @example preloadByFrictionN(75, { diameterMm: 10, pitchMm: 1.25, threadFriction: 0.12,
 *   headFriction: 0.12, bearingMeanMm: 12.8 }) // 46 640
 */
export function preloadByFrictionN(torqueNm: number, joint: FrictionJoint): Outcome<number> {
	if (!(torqueNm > 0)) return cannot('a torque is a number above zero');
	const arms = armsOf(joint);
	return arms.ok ? computedNumber((torqueNm * 1000) / arms.value.all) : arms;
}
