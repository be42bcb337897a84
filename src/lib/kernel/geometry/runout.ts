import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';
import { solved } from './linear-equations';

/** A dial's reading at an angle of the turn. */
export type AtAngle = { angleDeg: number; readMm: number };
export type AroundTheTurn = {
	runoutMm: number;
	eccentricityMm: number;
	/** The two parts of the eccentricity, towards 0° and towards 90°. */
	cosMm: number;
	sinMm: number;
	/** The angle at which the dial stands highest by eccentricity alone, 0 up to 360. */
	highAtDeg: number;
	/** What eccentricity leaves unexplained: largest less smallest of the rest. */
	outOfRoundMm: number;
	meanMm: number;
	/** The rest at each reading. */
	restMm: number[];
};

const largestMm = 1000;

/**
 * Runout: the full travel of a dial over a turn (total indicator reading).
 *
 * Formula: TIR = largest reading − smallest reading.
 * @param readMm readings around one turn, mm, at least four
 * @returns mm
 * Source: definition; ISO 1101, circular run-out.
 * @example runoutMm([0, 0.003, -0.002, 0.003]) // 0.005
 */
export function runoutMm(readMm: readonly number[]): Outcome<number> {
	if (readMm.length < 4) return cannot('a turn takes at least four readings, a quarter apart');
	if (readMm.some((one) => !(Math.abs(one) <= largestMm)))
		return cannot('a dial reading is a number in millimetres');
	return computed(tidy(Math.max(...readMm) - Math.min(...readMm)));
}

/**
 * How far a section's middle lies off the axis that it turns about: bend, where the journals run
 * true. Right where the section itself is round.
 *
 * Formula: e = TIR / 2.
 * @param tirMm total indicator reading, mm, zero or more
 * @returns mm
 * Source: definition: the dial goes from +e to −e in half a turn.
 * @example eccentricityMm(0.06) // 0.03
 */
export function eccentricityMm(tirMm: number): Outcome<number> {
	if (!(tirMm >= 0)) return cannot('a runout is a number, zero or more');
	return computedNumber(tirMm / 2);
}

/**
 * Tells eccentricity from out-of-round: what rises and falls once a turn belongs to the first, the
 * rest to the second. Four readings settle little; eight, 45° apart, show the shapes that a journal
 * wears to. On vee blocks the journals' own shape comes into it as well.
 *
 * Formula: m + a · cos θ + b · sin θ with the least sum of squared rests; e = √(a² + b²);
 * out-of-round = largest rest − smallest rest.
 * @param readings mm at degrees, at least four angles of one turn
 * @returns mm, degrees
 * Source: ISO 12181-1:2011, least squares reference circle, for e small beside the radius.
 * @example aroundTheTurn([0, 90, 180, 270].map((angleDeg, at) => ({ angleDeg,
 *   readMm: [0.02, 0, -0.02, 0][at] }))) // eccentricity 0.02 at 0°, nothing out of round
 */
export function aroundTheTurn(readings: readonly AtAngle[]): Outcome<AroundTheTurn> {
	const tir = runoutMm(readings.map((one) => one.readMm));
	if (!tir.ok) return tir;
	if (readings.some((one) => !(Math.abs(one.angleDeg) <= 3600)))
		return cannot('an angle is a number of degrees');
	const waves = readings.map(({ angleDeg }) => {
		const radians = (angleDeg * Math.PI) / 180;
		return [1, Math.cos(radians), Math.sin(radians)];
	});
	const sums = [0, 1, 2].map((row) =>
		[0, 1, 2].map((column) => total(waves.map((one) => (one[row] ?? 0) * (one[column] ?? 0))))
	);
	const fit = solved(
		sums,
		[0, 1, 2].map((row) =>
			total(waves.map((one, at) => (one[row] ?? 0) * (readings[at]?.readMm ?? 0)))
		)
	);
	if (!fit || widestGapDeg(readings) > 150)
		return cannot('the readings leave a large part of the turn open: read all the way around');
	const [meanMm = 0, a = 0, b = 0] = fit;
	const restMm = readings.map((one, at) =>
		tidy(one.readMm - total((waves[at] ?? []).map((wave, which) => wave * (fit[which] ?? 0))))
	);
	const highAtDeg = ((Math.atan2(b, a) * 180) / Math.PI + 360) % 360;
	return computed({
		runoutMm: tir.value,
		eccentricityMm: tidy(Math.hypot(a, b)),
		cosMm: tidy(a),
		sinMm: tidy(b),
		highAtDeg,
		outOfRoundMm: tidy(Math.max(...restMm) - Math.min(...restMm)),
		meanMm: tidy(meanMm),
		restMm
	});
}

function widestGapDeg(readings: readonly AtAngle[]): number {
	const angles = readings.map((one) => ((one.angleDeg % 360) + 360) % 360).sort((a, b) => a - b);
	return Math.max(...angles.map((one, at) => (angles[at + 1] ?? (angles[0] ?? 0) + 360) - one));
}

function total(values: readonly number[]): number {
	return values.reduce((sum, one) => sum + one, 0);
}
