/**
 * Integral of a function that is smooth between the marks, by Gauss and Legendre with sixteen
 * points in each piece. Not a formula of the bench: it serves the expectations beside it.
 *
 * @param of finite in [from, to] @param from, to finite @param marks where it bends; those outside
 * are left out
 * @example integral((x) => x * x, 0, 3, [1]) // 9
 */
export function integral(
	of: (x: number) => number,
	from: number,
	to: number,
	marks: readonly number[] = []
): number {
	if (!(to > from)) return 0;
	const edges = [from, ...marks.filter((one) => one > from && one < to), to].toSorted(
		(a, b) => a - b
	);
	let sum = 0;
	for (let i = 1; i < edges.length; i++) {
		const [a, b] = [edges[i - 1] as number, edges[i] as number];
		const [middle, half] = [(a + b) / 2, (b - a) / 2];
		for (const { at, weight } of points)
			sum += half * weight * (of(middle - half * at) + of(middle + half * at));
	}
	return sum;
}

const count = 16;

/** The positive roots of the Legendre polynomial and their weights, by Newton's method. */
const points = Array.from({ length: count / 2 }, (_, i) => {
	let at = Math.cos((Math.PI * (i + 0.75)) / (count + 0.5));
	let slope = 1;
	for (let step = 0; step < 10; step++) {
		let [before, now] = [1, at];
		for (let k = 2; k <= count; k++)
			[before, now] = [now, ((2 * k - 1) * at * now - (k - 1) * before) / k];
		slope = (count * (at * now - before)) / (at * at - 1);
		at -= now / slope;
	}
	return { at, weight: 2 / ((1 - at * at) * slope * slope) };
});
