import type { FaceGrid, WorstLine } from '$lib/kernel/geometry/flatness';
import type { FaceDrawing } from '../../drawings/face';
import { plain } from '../formula-figures';
import type { Overall } from './overall';

/** The face with its readings, and its worst line from the side. */
export function drawnFace(
	{ alongMm, acrossMm }: FaceGrid,
	{ places, words, valueMm, rests }: Overall,
	worst: WorstLine | undefined
): FaceDrawing {
	const [x0 = 0, y0 = 0] = [alongMm[0], acrossMm[0]];
	const says = `${words} ${valueMm.toFixed(3)} mm`;
	return {
		kind: 'face',
		rests,
		lengthMm: (alongMm.at(-1) ?? 0) - x0,
		widthMm: (acrossMm.at(-1) ?? 0) - y0,
		places: places.map(({ xMm, yMm, text, part, holds }) => ({
			xMm: xMm - x0,
			yMm: yMm - y0,
			text,
			part,
			...(holds ? { holds } : {})
		})),
		...(worst ? worstOf(worst, alongMm, acrossMm) : {}),
		says
	};
}

function worstOf(
	{ line, held, widthMm }: WorstLine,
	alongMm: readonly number[],
	acrossMm: readonly number[]
): Pick<FaceDrawing, 'worst' | 'profile'> {
	const [first, , last] = held;
	const place = (at: number): readonly [number, number] =>
		line.runs === 'along'
			? [(line.atMm[at] ?? 0) - (alongMm[0] ?? 0), (acrossMm[line.line] ?? 0) - (acrossMm[0] ?? 0)]
			: [(alongMm[line.line] ?? 0) - (alongMm[0] ?? 0), (line.atMm[at] ?? 0) - (acrossMm[0] ?? 0)];
	const [x1 = 0, x3 = 0] = [line.atMm[first], line.atMm[last]];
	const [z1 = 0, z3 = 0] = [line.heightMm[first], line.heightMm[last]];
	const slope = (z3 - z1) / (x3 - x1);
	const name = line.runs === 'along' ? `row ${line.line + 1}` : `column ${line.line + 1}`;
	return {
		worst: {
			fromMm: place(first),
			toMm: place(last),
			words: `${name}: ${widthMm.toFixed(3)} mm in ${plain(x3 - x1)} mm`
		},
		profile: {
			atMm: line.atMm.map((one) => one - (line.atMm[0] ?? 0)),
			offMm: line.heightMm.map((one, at) => one - (z1 + slope * ((line.atMm[at] ?? 0) - x1))),
			held
		}
	};
}
