import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { figureWords, partWords, tighteningWords, type FigurePart } from './figure-words';
import type { SheetFigures } from './sheet-figures';

const placeholder = /\{([a-z][\w.-]*)\}/g;
const part = /^(.+)\.(nominal|least|most|wearLimit)$/;

/** The data-sheet keys that a text stands on, without the part that it picks of one. */
export function keysIn(...texts: (string | undefined)[]): string[] {
	const found = texts.flatMap((text) => [...(text ?? '').matchAll(placeholder)].map(keyOf));
	return [...new Set(found)];
}

function keyOf(match: RegExpMatchArray): string {
	const raw = match[1] ?? '';
	return part.exec(raw)?.[1] ?? raw;
}

/** `{crankpin.diameter}` becomes "39.970 to 39.986 mm"; `{crankpin.diameter.least}` one end of it. */
export function fillWords(text: string, sheet: SheetFigures): Outcome<string> {
	let because = '';
	const filled = text.replace(placeholder, (whole, raw: string) => {
		const said = wordsFor(raw, sheet);
		if (said.ok) return said.value;
		because ||= said.because;
		return whole;
	});
	return because ? cannot(because) : computed(filled);
}

function wordsFor(raw: string, sheet: SheetFigures): Outcome<string> {
	const [, key, end] = part.exec(raw) ?? [];
	if (key && end) {
		const figure = sheet.figure(key);
		return figure.ok ? partWords(figure.value, end as FigurePart) : figure;
	}
	const figure = sheet.figure(raw);
	if (figure.ok) return computed(figureWords(figure.value));
	const tightening = sheet.tightening(raw);
	return tightening.ok ? computed(tighteningWords(tightening.value)) : figure;
}

/** Fills several texts at once; the first that cannot be filled says why. */
export function fillAll(texts: string[], sheet: SheetFigures): Outcome<string[]> {
	const out: string[] = [];
	for (const text of texts) {
		const one = fillWords(text, sheet);
		if (!one.ok) return one;
		out.push(one.value);
	}
	return computed(out);
}
