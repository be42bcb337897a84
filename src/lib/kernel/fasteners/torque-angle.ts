import { cannot, computed, type Outcome } from '../outcome';
import { inSeriesNPerMm } from './stiffness';
import { travelMm } from './turn';

export type TorqueAngle = {
	/** Preload after the snug torque, N. */
	snugN: number;
	/** Whole angle turned after it, degrees. */
	angleDeg: number;
	pitchMm: number;
	boltNPerMm: number;
	jointNPerMm: number;
	/** Load at which the bolt begins to yield, N. */
	yieldN: number;
	/** Rise of the load beyond yield as a share of the elastic rise: 0 flat, below 1. */
	hardening?: number;
	/** Load at which it parts, N: with a hardening the line ends there. */
	tensileN?: number;
};
export type Tightened = {
	preloadN: number;
	/** Angle after snug at which yield begins, degrees; beyond `angleDeg` where it is not reached. */
	angleAtYieldDeg: number;
	beyondYield: boolean;
	/** What of the angle was turned past yield, degrees. */
	pastYieldDeg: number;
	/** Elastic and lasting stretch of the bolt, mm. */
	elasticMm: number;
	lastingMm: number;
	/** Angle against load from the snug torque on, corners only: two straight lines. */
	points: { angleDeg: number; loadN: number }[];
};

/**
 * Load of a bolt after a snug torque and an angle, up to yield and past it.
 *
 * Formula: F = Fs + k · P · α/360°, k = kb · kj / (kb + kj), up to Fy; beyond, F = Fy + h · k · (s − sy).
 * Beyond yield the bolt alone gives way: the model is two straight lines, flat unless a hardening
 * is given, and shows how far a bolt is drawn rather than exactly how hard it pulls.
 * @param asked loads in N, stiffnesses in N/mm, angle in degrees, pitch in mm; see the type
 * @returns preload in N, the angle at yield, elastic and lasting stretch in mm, the line to draw
 * Source: VDI 2230 part 1, torque and angle controlled tightening; bilinear model of the bolt.
 * @example tightenByAngle({ snugN: 15_000, angleDeg: 90, pitchMm: 1.25, boltNPerMm: 130_000,
 *   jointNPerMm: 390_000, yieldN: 57_500 }) // 45 470 N, yield after 125.5°
 */
export function tightenByAngle(asked: TorqueAngle): Outcome<Tightened> {
	const { snugN, angleDeg, pitchMm, boltNPerMm, yieldN, hardening = 0 } = asked;
	if (!(snugN >= 0) || !(angleDeg >= 0) || angleDeg > 3600)
		return cannot('snug load and angle are numbers, zero or more, and no bolt is turned ten times');
	if (!(pitchMm > 0) || pitchMm > 100) return cannot('a pitch is a number above zero');
	if (!(yieldN > 0) || !Number.isFinite(yieldN))
		return cannot('a yield load is a number above zero');
	if (snugN > yieldN) return cannot('the snug torque alone takes the bolt past its yield');
	if (!(hardening >= 0) || hardening >= 1) return cannot('a hardening lies from 0 to below 1');
	const stiffness = inSeriesNPerMm(boltNPerMm, asked.jointNPerMm);
	if (!stiffness.ok) return stiffness;
	const k = stiffness.value;
	const turnedMm = travelMm(angleDeg, pitchMm);
	const toYieldMm = (yieldN - snugN) / k;
	const angleAtYieldDeg = (toYieldMm / pitchMm) * 360;
	const beyondMm = Math.max(0, turnedMm - toYieldMm);
	const preload = beyondMm > 0 ? yieldN + hardening * k * beyondMm : snugN + k * turnedMm;
	const elasticMm = preload / boltNPerMm;
	if (asked.tensileN !== undefined && preload > asked.tensileN)
		return cannot('the bolt parts before that angle: its tensile load is passed');
	if (![preload, angleAtYieldDeg, beyondMm, elasticMm].every(Number.isFinite))
		return cannot('the figures give no number: look for a slip in one of them');
	const end = { angleDeg, loadN: preload };
	const start = { angleDeg: 0, loadN: snugN };
	return computed({
		preloadN: preload,
		angleAtYieldDeg,
		beyondYield: beyondMm > 0,
		pastYieldDeg: Math.max(0, angleDeg - angleAtYieldDeg),
		elasticMm,
		lastingMm: beyondMm * (1 - hardening),
		points: beyondMm > 0 ? [start, { angleDeg: angleAtYieldDeg, loadN: yieldN }, end] : [start, end]
	});
}

/**
 * Angle after snug for a wanted preload below yield: the same line turned round.
 *
 * Formula: α = 360° · (F − Fs) · (1/kb + 1/kj) / P.
 * @param wantedN F, N, from the snug load up to yield @param asked as `tightenByAngle`, without the angle
 * @returns degrees
 * Source: as `tightenByAngle`.
 * @example angleForPreloadDeg(45_468.75, { snugN: 15_000, pitchMm: 1.25, boltNPerMm: 130_000,
 *   jointNPerMm: 390_000, yieldN: 57_500 }) // 90
 */
export function angleForPreloadDeg(
	wantedN: number,
	asked: Omit<TorqueAngle, 'angleDeg' | 'hardening' | 'tensileN'>
): Outcome<number> {
	if (!(wantedN >= asked.snugN)) return cannot('the wanted load lies below the snug load');
	if (wantedN > asked.yieldN)
		return cannot('the wanted load lies past yield: no angle of the straight line gives it');
	const straight = tightenByAngle({ ...asked, angleDeg: 0, yieldN: Math.max(wantedN, 1e-9) });
	return straight.ok ? computed(straight.value.angleAtYieldDeg) : straight;
}
