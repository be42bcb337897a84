import { cannot, type Outcome } from '$lib/kernel/outcome';
import type { AnyCalculator } from './calculator';
import type { Entry, FieldFace, System } from './field';
import type { Worked } from './worked';

export type Entries = Record<string, Entry>;
export type Read = {
	/** What is wrong in a field that something stands in. */
	faults: Record<string, string>;
	/** Words of the fields that the sum still waits for. */
	wanted: string[];
	/** Only when nothing is missing and nothing is wrong. */
	worked?: Outcome<Worked>;
};

/** Reads what stands in a calculator's fields and, when all is there, works it. */
export function readEntries(of: AnyCalculator, entries: Entries, system: System): Read {
	const faults: Record<string, string> = {};
	const wanted: string[] = [];
	const values: Record<string, unknown> = {};
	for (const [key, field] of Object.entries(of.fields)) {
		if (!isAsked(field, entries)) continue;
		const entry = entries[key] ?? { text: '' };
		if (isEmpty(field, entry)) {
			if (!field.optional || field.only) wanted.push(field.words);
			continue;
		}
		const found = field.read(entry, system);
		if (found.ok) values[key] = found.value;
		else faults[key] = found.because;
	}
	if (wanted.length > 0 || Object.keys(faults).length > 0) return { faults, wanted };
	return { faults, wanted, worked: finite(of.work(values as never)) };
}

/** Whether a field matters as the others stand. */
export function isAsked({ only }: FieldFace, entries: Entries): boolean {
	return !only || entries[only.field]?.text === only.is;
}

export function isEmpty(field: FieldFace, { text }: Entry): boolean {
	return field.kind === 'grid' || field.kind === 'table'
		? text.replace(/[_*\s]/g, '') === ''
		: text.trim() === '';
}

/** The entries of a page that nothing was typed in yet. */
export function initialEntries(of: AnyCalculator): Entries {
	return Object.fromEntries(
		Object.entries(of.fields).map(([key, field]) => [key, { text: field.initial ?? '' }])
	);
}

export function exampleEntries(of: AnyCalculator): Entries {
	return Object.fromEntries(
		Object.entries(of.fields).map(([key, field]) => [key, { text: field.example }])
	);
}

/** No page prints a result that is no number, whatever a calculator did. */
function finite(worked: Outcome<Worked>): Outcome<Worked> {
	if (!worked.ok) return worked;
	const odd = worked.value.lines.some((line) => 'value' in line && !Number.isFinite(line.value));
	return odd ? cannot('the figures give no number: look for a slip in one of them') : worked;
}
