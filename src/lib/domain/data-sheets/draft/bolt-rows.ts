import { cannot, computed } from '$lib/kernel/outcome';
import { readNumber } from '$lib/kernel/quantity/read-number';
import { list, type Codec } from './codecs';

export type TypedBolt = { id: string; xMm: number; yMm: number };

/** One bolt a line, "A1 -129 45", as typed or as pasted from a spreadsheet. */
export const boltRows: Codec = {
	write: (value) =>
		list(value)
			.map((one) => one as TypedBolt)
			.map(({ id, xMm, yMm }) => `${id} ${xMm} ${yMm}`)
			.join('\n'),
	read(text) {
		const { bolts, fault } = readBolts(text);
		return fault === undefined ? computed(bolts) : cannot(fault);
	}
};

/** The bolts that can be read so far, to be drawn while others are typed, and the first fault. */
export function readBolts(text: string): { bolts: TypedBolt[]; fault?: string } {
	const bolts: TypedBolt[] = [];
	let fault: string | undefined;
	for (const [at, line] of text.split('\n').entries()) {
		if (line.trim() === '') continue;
		const cells = line
			.trim()
			.split(/\t|;|\s+/)
			.map((one) => one.trim().replace(/,$/, ''));
		const [id = '', x = '', y = ''] = cells.filter(Boolean);
		const [xMm, yMm] = [readNumber(x, 'mm'), readNumber(y, 'mm')];
		if (cells.filter(Boolean).length === 3 && xMm.ok && yMm.ok)
			bolts.push({ id, xMm: xMm.value, yMm: yMm.value });
		else
			fault ??= `line ${at + 1}, “${line.trim()}”: a bolt is its name, x and y in mm, as A1 −129 45`;
	}
	return { bolts, ...(fault === undefined ? {} : { fault }) };
}
