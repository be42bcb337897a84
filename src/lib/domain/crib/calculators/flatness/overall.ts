import type { Cell } from '$lib/kernel/geometry/flatness';
import { abovePlaneMm, minimumZone, type FacePoint } from '$lib/kernel/geometry/minimum-zone';
import { largestGapMm, type Gaps } from '$lib/kernel/geometry/straight-edge';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../../working';
import { placeWords, zoneStep } from './steps';

/** What a face comes to as a whole, with what the drawing marks. */
export type Overall = {
	words: string;
	valueMm: number;
	rests: 'planes' | 'feeler';
	/** What each reading that it rests on has in it. */
	weights: readonly number[];
	steps: Step[];
	notes: string[];
	places: (FacePoint & Cell & { text: string; part: number; holds?: 'upper' | 'lower' })[];
};

export function overallByDial(points: readonly (FacePoint & Cell)[]): Outcome<Overall> {
	const zone = minimumZone(points);
	if (!zone.ok) return zone;
	const { widthMm, held, lower } = zone.value;
	const sides = new Map(held.map(({ at, weight }) => [at, weight]));
	return computed({
		words: 'Flatness overall',
		valueMm: widthMm,
		rests: 'planes',
		weights: held.map((one) => one.weight),
		steps: [zoneStep(points, held, widthMm)],
		notes: [
			'Read the marked places once more before you decide: scatter of the dial only ever adds to a flatness.'
		],
		places: points.map((one, at) => {
			const side = sides.get(at);
			return {
				...one,
				text: one.zMm.toFixed(3),
				part: widthMm > 0 ? abovePlaneMm(lower, one) / widthMm : 0,
				...(side === undefined ? {} : { holds: side > 0 ? 'upper' : 'lower' })
			};
		})
	});
}

export function overallByFeeler(
	gaps: Gaps,
	points: readonly (FacePoint & Cell)[]
): Outcome<Overall> {
	const largest = largestGapMm(gaps);
	if (!largest.ok) return largest;
	if (points.length < 3) return cannot('read the gap at three places of a line at least');
	const deepest = points.filter((one) => -one.zMm === largest.value);
	return computed({
		words: 'Largest gap',
		valueMm: largest.value,
		rests: 'feeler',
		weights: [1],
		steps: [
			{
				words: `The thickest feeler that enters, at ${deepest.map(placeWords).join(', ')}`,
				value: largest.value,
				unit: 'mm',
				decimals: 3
			}
		],
		notes: [
			'A straight edge judges one line at a time, and a twist between the rows does not show: lay it along both diagonals as well.'
		],
		places: points.map((one) => ({
			...one,
			text: (0 - one.zMm).toFixed(3),
			part: largest.value > 0 ? 1 + one.zMm / largest.value : 1,
			...(deepest.includes(one) && largest.value > 0 ? { holds: 'lower' as const } : {})
		}))
	});
}
