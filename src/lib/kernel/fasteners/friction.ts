import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import { threadOf } from './thread';

/** The factors of the published rule: 1/(2π) and 1/(2 cos 30°), each rounded up to two places. */
const perPitch = 0.16;
const perPitchDiameter = 0.58;

export type FrictionJoint = {
	diameterMm: number;
	pitchMm: number;
	/** Friction coefficients, about 0.08 to 0.25. */
	threadFriction: number;
	headFriction: number;
	/** Mean diameter under the head, mm: the middle between hole and outer edge of the face. */
	bearingMeanMm: number;
};
export type TorqueSplit = {
	torqueNm: number;
	/** Shares of the torque: what stretches the bolt, and what the two frictions eat. Together 1. */
	shares: { pitch: number; thread: number; head: number };
	/** The nut factor that would give the same torque. */
	nutFactor: number;
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
		nutFactor: all / joint.diameterMm
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

type Arms = { pitch: number; thread: number; head: number; all: number; pitchDiameterMm: number };

/** What each share takes of the torque for one newton, in mm. */
function armsOf(joint: FrictionJoint): Outcome<Arms> {
	const { threadFriction, headFriction, bearingMeanMm: mean } = joint;
	const thread = threadOf(joint.diameterMm, joint.pitchMm);
	if (!thread.ok) return thread;
	const odd = (friction: number) => !(friction >= 0) || friction > 1;
	if (odd(threadFriction) || odd(headFriction))
		return cannot('a friction coefficient lies between 0 and 1');
	if (!(mean > joint.diameterMm))
		return cannot('the mean bearing diameter is larger than the bolt');
	const { pitchDiameterMm } = thread.value;
	const arms = {
		pitch: perPitch * joint.pitchMm,
		thread: perPitchDiameter * pitchDiameterMm * threadFriction,
		head: (mean / 2) * headFriction
	};
	const all = arms.pitch + arms.thread + arms.head;
	return Number.isFinite(all)
		? computed({ ...arms, all, pitchDiameterMm })
		: cannot('the bearing diameter is no number');
}
