import { cannot, computed, type Outcome } from '../outcome';
import type { FacePoint } from './minimum-zone';
import { straightness, type Profile, type Straightness } from './straightness';

/**
 * A face read on a grid: rows lie across it, columns along it. Null where there is no metal to read,
 * over a bore or a bolt hole.
 */
export type FaceGrid = {
	alongMm: readonly number[];
	acrossMm: readonly number[];
	heightMm: readonly (readonly (number | null)[])[];
};
/** One line of a face, with the grid's places of its readings. */
export type FaceLine = Profile & {
	runs: 'along' | 'across';
	/** Row of a line along, column of a line across. */
	line: number;
	/** Column (along) or row (across) of each reading. */
	places: readonly number[];
};
export type WorstLine = Straightness & { line: FaceLine };

/** The readings of a grid, each with its place. */
export function facePoints(face: FaceGrid): Outcome<(FacePoint & Cell)[]> {
	const shape = gridShape(face);
	if (!shape.ok) return shape;
	return computed(
		face.heightMm.flatMap((row, r) =>
			row.flatMap((zMm, c) =>
				zMm === null
					? []
					: [{ xMm: face.alongMm[c] ?? 0, yMm: face.acrossMm[r] ?? 0, zMm, row: r, column: c }]
			)
		)
	);
}
export type Cell = { row: number; column: number };

/** Every line of a grid that holds three readings or more, along it or also across it. */
export function faceLines(face: FaceGrid, which: 'along' | 'both'): Outcome<FaceLine[]> {
	const points = facePoints(face);
	if (!points.ok) return points;
	const along = face.acrossMm.map((_, row): FaceLine => {
		const these = points.value.filter((one) => one.row === row);
		return {
			runs: 'along',
			line: row,
			places: these.map((one) => one.column),
			atMm: these.map((one) => one.xMm),
			heightMm: these.map((one) => one.zMm)
		};
	});
	const across = face.alongMm.map((_, column): FaceLine => {
		const these = points.value.filter((one) => one.column === column);
		return {
			runs: 'across',
			line: column,
			places: these.map((one) => one.row),
			atMm: these.map((one) => one.yMm),
			heightMm: these.map((one) => one.zMm)
		};
	});
	return computed(
		[...along, ...(which === 'both' ? across : [])].filter((one) => one.atMm.length >= 3)
	);
}

/**
 * The line of a face that departs most from straight, overall or within any stretch of a given
 * length, as a straight edge laid along it would show. A face is never flatter than its worst line.
 *
 * @param lines mm, from `faceLines` @param withinMm length of the stretch, mm
 * @returns mm, with the line and its three readings; "cannot" where no line can be judged
 * Source: as `straightness`; a limit "in any 100 mm" is read along lines, as with a straight edge.
 * @example worstLine(lines, 100) // 0.02 in row 1
 */
export function worstLine(lines: readonly FaceLine[], withinMm = Infinity): Outcome<WorstLine> {
	let worst: WorstLine | undefined;
	let because = 'no line holds three readings';
	for (const line of lines) {
		const found = straightness(line, withinMm);
		if (!found.ok) because = found.because;
		else if (!worst || found.value.widthMm > worst.widthMm) worst = { ...found.value, line };
	}
	return worst ? computed(worst) : cannot(because);
}

/**
 * What a limit stated over a length allows over another.
 *
 * Formula: allowed = (limit per 100 mm) · L / 100.
 * @param per100Mm limit in 100 mm, mm, zero or more @param lengthMm mm, above zero
 * @returns mm
 * Source: proportion; US Army manuals state such limits by the inch of span.
 * @example allowedOverMm(0.075, 304.8) // 0.2286
 */
export function allowedOverMm(per100Mm: number, lengthMm: number): Outcome<number> {
	if (!(per100Mm >= 0 && per100Mm <= 100)) return cannot('a limit is a number, zero or more');
	if (!(lengthMm > 0 && lengthMm <= 1e5)) return cannot('a length is a number above zero');
	return computed((per100Mm * lengthMm) / 100);
}

function gridShape({ alongMm, acrossMm, heightMm }: FaceGrid): Outcome<true> {
	if (heightMm.length !== acrossMm.length)
		return cannot(`${heightMm.length} rows are read, but ${acrossMm.length} places across named`);
	const odd = heightMm.find((row) => row.length !== alongMm.length);
	if (odd)
		return cannot(
			`${odd.length} readings stand in a row, but ${alongMm.length} places along named`
		);
	const grow = (places: readonly number[]) =>
		places.every((one, at) => Number.isFinite(one) && (at === 0 || one > (places[at - 1] ?? one)));
	return grow(alongMm) && grow(acrossMm)
		? computed(true)
		: cannot('the places along and across grow from one to the next');
}
