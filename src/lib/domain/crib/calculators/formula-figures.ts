import { formatQuantity } from '$lib/kernel/quantity/format-quantity';

/** A figure as it is put into a formula, with a true minus. */
export function figure(value: number, decimals = 3): string {
	// Not 10 ** −4, which is a hair less than 0.0001.
	return formatQuantity(value, '', Number(`1e-${decimals}`));
}

/** A size as it was typed: no more places than it has, and no dust from another unit. */
export function plain(value: number): string {
	return String(Number(value.toFixed(4))).replace('-', '−');
}

/** A figure after a sign of its own: what lies below zero stands in brackets. */
export function bracketed(value: number, decimals = 3): string {
	const printed = figure(value, decimals);
	return printed.startsWith('−') ? `(${printed})` : printed;
}
