import type { ResultLine } from '../../worked';
import type { Turned } from './angle-steps';

const kn = { unit: 'kN', decimals: 1 };
const degrees = { unit: '°', decimals: 0 };

/** What came out, for the slippery bolt and for the one that drags. */
export function angleLines([slippery, dragging]: readonly Turned[], yieldN: number): ResultLine[] {
	if (!slippery) return [];
	const percent = { unit: '%', decimals: 2 };
	return [
		{
			key: 'preload',
			words: dragging ? 'Preload, if the thread is slippery' : 'Preload',
			value: slippery.preloadN / 1000,
			...kn,
			main: true
		},
		...(dragging
			? [
					{
						key: 'least',
						words: 'Preload, if the thread drags',
						value: dragging.preloadN / 1000,
						...kn,
						main: true
					}
				]
			: []),
		{
			key: 'yield-angle',
			words: dragging ? 'Begins to yield after, at the earliest' : 'Begins to yield after',
			value: slippery.angleAtYieldDeg,
			...degrees,
			main: true
		},
		...(dragging
			? [
					{
						key: 'yield-latest',
						words: 'and at the latest after',
						value: dragging.angleAtYieldDeg,
						...degrees
					}
				]
			: []),
		{ key: 'past', words: 'Turned past yield', value: slippery.pastYieldDeg, ...degrees },
		{
			key: 'lasting',
			words: 'Drawn for good',
			value: slippery.lastingMm,
			unit: 'mm',
			decimals: 3
		},
		{
			key: 'lasting-share',
			words: 'of the length that yields',
			value: 100 * slippery.strain,
			...percent
		},
		{
			key: 'springs',
			words: 'Stretch that springs back',
			value: slippery.elasticMm,
			unit: 'mm',
			decimals: 3
		},
		{ key: 'yield', words: 'Load at yield', value: yieldN / 1000, ...kn },
		...(slippery.neededDeg === undefined
			? []
			: [
					{
						key: 'needed',
						words: 'Angle for the wanted preload',
						value: slippery.neededDeg,
						...degrees
					}
				]),
		...(dragging?.neededDeg === undefined
			? []
			: [
					{
						key: 'needed-most',
						words: 'The same, if the thread drags',
						value: dragging.neededDeg,
						...degrees
					}
				])
	];
}

/** What these very bolts are to be known by. */
export function angleNotes(ends: readonly Turned[], proofN: number): string[] {
	const [slippery] = ends;
	if (!slippery) return [];
	if (!ends.some((one) => one.beyondYield))
		return slippery.preloadN > proofN
			? ['Past the proof load and below yield: the bolt is not used again.']
			: [];
	const all = ends.every((one) => one.beyondYield);
	return [
		all
			? 'Turned past yield: single use. Makers do this on purpose, since the load then hardly depends on friction.'
			: 'Past yield if the thread is slippery, below it if the thread drags: such bolts do not clamp alike. Count it as single use, and look at the angle again.',
		...(slippery.strain > 0.01
			? [
					'Drawn by more than one per cent of the length that yields: look at the angle and the stretched length again.'
				]
			: [])
	];
}
