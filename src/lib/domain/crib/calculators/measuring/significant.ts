/** Seven figures of a number, without the noughts that say nothing, and a true minus. */
export function significant(value: number): string {
	const size = Math.abs(value);
	const text =
		size !== 0 && (size < 1e-6 || size >= 1e12)
			? value.toExponential(6)
			: String(Number(value.toPrecision(7)));
	return text.replace(/-/g, '−');
}
