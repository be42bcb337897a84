import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

/** A dial's readings over a mandrel at two places, and how far apart these lie. */
export type MandrelReadings = { nearMm: number; farMm: number; apartMm: number };

/**
 * How far the small end's mandrel stands out of line with the big end's, brought to 100 mm of
 * mandrel. Read in the plane of the rod, both mandrels upright one over the other, it is bend; read
 * square to that plane, the rod laid on its side, it is twist.
 *
 * Formula: ((far − near) / S) · 100 of the small end, less the same of the big end.
 * @param small mm, over the small end's mandrel
 * @param big mm, over the big end's; left out where the fixture holds it level
 * @returns mm in 100 mm; its sign says to which side the far end rises
 * Source: method as in US Army TM 9-2815-226-34-1, rod check steps 5-9; proportion.
 * @example outOfLinePer100Mm({ nearMm: 0, farMm: 0.03, apartMm: 120 }) // 0.025
 */
export function outOfLinePer100Mm(small: MandrelReadings, big?: MandrelReadings): Outcome<number> {
	for (const one of big ? [small, big] : [small]) {
		if (!(one.apartMm > 0 && one.apartMm <= 1000))
			return cannot('the two readings on a mandrel are taken a length above zero apart');
		if (!(Math.abs(one.nearMm) <= 1000 && Math.abs(one.farMm) <= 1000))
			return cannot('a dial reading is a number in millimetres');
	}
	const tilt = (one: MandrelReadings) => ((one.farMm - one.nearMm) / one.apartMm) * 100;
	const found = tidy(tilt(small) - (big ? tilt(big) : 0));
	// Ten millimetres in a hundred are nearly six degrees: that is seen, not measured.
	return Math.abs(found) <= 10
		? computedNumber(found)
		: cannot(
				'no rod stands that far out of line: look at the readings and the distance between them'
			);
}

/** What each reading has in the result of `outOfLinePer100Mm`, far and near of each mandrel. */
export function outOfLineWeights(small: MandrelReadings, big?: MandrelReadings): number[] {
	return (big ? [small, big] : [small]).flatMap(({ apartMm }) => [100 / apartMm, -100 / apartMm]);
}

/**
 * Length of a rod from centre to centre, from the distance over both mandrels: a bent rod is short.
 *
 * Formula: L = H − (D + d) / 2.
 * @param overMm over the outsides of both mandrels, H, mm
 * @param bigMm big end's mandrel, D, mm @param smallMm small end's mandrel, d, mm
 * @returns mm
 * Source: definition.
 * @example rodLengthMm(170.5, 40, 18) // 141.5
 */
export function rodLengthMm(overMm: number, bigMm: number, smallMm: number): Outcome<number> {
	if (!(overMm > 0 && bigMm > 0 && smallMm > 0))
		return cannot('the mandrels and the distance over them are numbers above zero');
	if (overMm <= bigMm + smallMm)
		return cannot('the distance over the mandrels is larger than both of them together');
	return computedNumber(tidy(overMm - (bigMm + smallMm) / 2));
}
