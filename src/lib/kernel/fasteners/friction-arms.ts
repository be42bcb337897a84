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
/** What each share takes of the torque for one newton, mm. */
export type Arms = {
	pitch: number;
	thread: number;
	head: number;
	all: number;
	pitchDiameterMm: number;
};

/** The lever arms of a joint; "cannot" for sizes and frictions that no bolt has. */
export function armsOf(joint: FrictionJoint): Outcome<Arms> {
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
