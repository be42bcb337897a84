import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { readNumber } from '$lib/kernel/quantity/read-number';

/** A reading as typed, in millimetres; an emptied cell is no reading, and a slip is named. */
export function readCell(
	typed: string,
	plausible: { leastMm: number; mostMm: number }
): Outcome<number | null> {
	const text = typed.replace(/\s*mm$/i, '').trim();
	if (text === '') return computed(null);
	const read = readNumber(text, 'mm');
	if (!read.ok)
		return cannot(`“${typed}” is no number: ${read.because}. Type millimetres, such as 39.982.`);
	const value = read.value;
	if (value < plausible.leastMm || value > plausible.mostMm)
		return cannot(
			`${value} mm is not between ${plausible.leastMm} and ${plausible.mostMm} mm. Look at the reading again.`
		);
	return computed(value);
}
