/** A length as a working prints it, with a true minus sign. */
export function printed(value: number, decimals: number): string {
	const text = value.toFixed(decimals).replace(/^-/, '−');
	return /^−0(\.0*)?$/.test(text) ? text.slice(1) : text;
}

/** As many places as show two figures of an uncertainty (JCGM 100:2008, 7.2.6), 1 to 7. */
export function placesFor(uncertainty: number): number {
	if (!(uncertainty > 0)) return 4;
	return Math.min(7, Math.max(1, 1 - Math.floor(Math.log10(uncertainty))));
}
