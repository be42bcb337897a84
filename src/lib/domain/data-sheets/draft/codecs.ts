import { coarsePitchMm } from '$lib/kernel/fasteners/standard-pitches';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { parseStages } from '$lib/kernel/quantity/parse-stages';
import { readNumber } from '$lib/kernel/quantity/read-number';
import { unitWords } from '../unit-words';

/** Between a value of a sheet and the text that a person types for it. Empty text is no value. */
export type Codec = {
	write: (value: unknown) => string;
	/** @param unit of the row that the field stands in, where its rows have one */
	read: (text: string, unit: string) => Outcome<unknown>;
};

const plain = (value: unknown) =>
	typeof value === 'string' || typeof value === 'number' ? String(value) : '';

export const words: Codec = { write: plain, read: (text) => computed(text.trim()) };

export const figure: Codec = {
	write: (value) => plain(value).replace('-', '−'),
	read: (text, unit) => readNumber(text, unitWords[unit as keyof typeof unitWords] ?? 'mm')
};

export const whole: Codec = {
	write: plain,
	read: (text) => (/^\s*\d{1,4}\s*$/.test(text) ? computed(Number(text)) : cannot('type a count'))
};

export const check: Codec = {
	write: (value) => (value === true ? 'yes' : ''),
	read: (text) => computed(text === 'yes')
};

/** "M10 × 1.25"; without a pitch the coarse one is meant. */
export const thread: Codec = {
	write(value) {
		const { diameterMm, pitchMm } = (value ?? {}) as { diameterMm?: number; pitchMm?: number };
		return diameterMm === undefined ? '' : `M${diameterMm} × ${pitchMm ?? ''}`.replace(/ × $/, '');
	},
	read(text) {
		const [, size = '', pitch = ''] =
			/^\s*M?\s*([\d.,]+)\s*(?:[x×*]\s*([\d.,]+))?\s*$/i.exec(text) ?? [];
		const diameterMm = readNumber(size, 'mm');
		if (!diameterMm.ok) return cannot('type it as M10 × 1.25');
		if (pitch === '') {
			const pitchMm = coarsePitchMm(diameterMm.value);
			return pitchMm === undefined
				? cannot(`M${diameterMm.value} has no usual pitch: type it as M10 × 1.25`)
				: computed({ diameterMm: diameterMm.value, pitchMm });
		}
		const pitchMm = readNumber(pitch, 'mm');
		return pitchMm.ok
			? computed({ diameterMm: diameterMm.value, pitchMm: pitchMm.value })
			: pitchMm;
	}
};

type Stage = { torqueNm?: number; angleDeg?: number };

/** "30 N·m + 90° + 90°" */
export const stages: Codec = {
	write: (value) =>
		list(value)
			.map((one) => one as Stage)
			.map((one) => (one.torqueNm === undefined ? `${one.angleDeg}°` : `${one.torqueNm} N·m`))
			.join(' + '),
	read: (text) => parseStages(text, 'N·m')
};

/** "A2 B3 B2 A3": names with spaces, commas, semicolons or arrows between. */
export const names: Codec = {
	write: (value) => list(value).map(plain).join(' '),
	read: (text) => computed(text.split(/[\s,;→]+/).filter(Boolean))
};

/** "1 3 4 2" */
export const counts: Codec = {
	write: names.write,
	read(text) {
		const all = text.split(/[\s,;→-]+/).filter(Boolean);
		return all.every((one) => /^\d{1,3}$/.test(one))
			? computed(all.map(Number))
			: cannot('type cylinder numbers with spaces between: 1 3 4 2');
	}
};

/** "0.25 0.50" */
export const figures: Codec = {
	write: (value) => list(value).map(plain).join(' '),
	read(text) {
		const read: number[] = [];
		for (const one of text.split(/;|,\s|\s/).filter((word) => word.trim() !== '')) {
			const found = readNumber(one, 'mm');
			if (!found.ok) return cannot(`“${one}”: ${found.because}`);
			read.push(found.value);
		}
		return computed(read);
	}
};

export function list(value: unknown): unknown[] {
	return Array.isArray(value) ? value : [];
}
