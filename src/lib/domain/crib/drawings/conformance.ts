import { normalDensity } from '$lib/kernel/statistics/distributions/normal';

/** Where the true value may lie, as a bell about the reading, between limits with their guard bands. */
export type ConformanceDrawing = {
	kind: 'conformance';
	from: number;
	to: number;
	value: number;
	/** Height 0 to 1 along the axis; a single upright where nothing is uncertain. */
	bell: { at: number; height: number }[];
	limits: { at: number; side: 'least' | 'most' }[];
	guardBand: number;
	conformance: number;
	unit: string;
	decimals: number;
};

/** The axis holds the bell and every limit with its guard band. */
export function conformanceDrawing(
	asked: Omit<ConformanceDrawing, 'kind' | 'from' | 'to' | 'bell'> & { standard: number }
): ConformanceDrawing {
	const { standard, ...drawn } = asked;
	const { value, limits, guardBand } = drawn;
	const marks = [
		value - 3.5 * standard,
		value + 3.5 * standard,
		...limits.flatMap(({ at }) => [at - guardBand, at + guardBand])
	];
	const [least, most] = [Math.min(...marks), Math.max(...marks)];
	const margin = 0.05 * (most - least) || Math.abs(value) || 1;
	const steps = 56;
	const bell = Array.from({ length: steps + 1 }, (_, at) => {
		const z = 7 * (at / steps) - 3.5;
		return { at: value + z * standard, height: normalDensity(z) / normalDensity(0) };
	});
	return { kind: 'conformance', ...drawn, bell, from: least - margin, to: most + margin };
}
