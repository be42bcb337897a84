import type { AnyCalculator } from './calculator';
import { textOf } from './cells';
import type { System } from './field';
import { initialEntries, type Entries } from './read-entries';

/** The longest text that a field takes from an address: a page of readings, and no more. */
const longest = 4000;
const mostCells = 40;

export type Opened = { entries: Entries; system: System };

/** What a link under `/crib/…` says to type. Anything that is no field of the calculator is left out. */
export function fromLink(of: AnyCalculator, query: URLSearchParams): Opened {
	const asked = query.get('units');
	const system: System = asked === 'inch' || asked === 'metric' ? asked : (of.opensIn ?? 'metric');
	const entries = initialEntries(of);
	for (const [key, field] of Object.entries(of.fields)) {
		const text =
			field.kind === 'grid' || field.kind === 'table'
				? (query.get(key) ?? cellsByName(query, key))
				: query.get(key);
		const unit = query.get(`${key}.u`);
		if (text !== null && text !== undefined) entries[key] = { text: text.slice(0, longest) };
		if (unit && 'unit' in field)
			entries[key] = { text: '', ...entries[key], unit: unit.slice(0, 12) };
	}
	return { entries, system };
}

/** The address's query that opens the page with these entries again. */
export function toLink(of: AnyCalculator, { entries, system }: Opened): string {
	const query = new URLSearchParams();
	if (system !== (of.opensIn ?? 'metric')) query.set('units', system);
	for (const [key, field] of Object.entries(of.fields)) {
		const { text = '', unit } = entries[key] ?? {};
		const blank = text.replace(/[_*\s]/g, '') === '';
		if (!blank || (field.initial !== undefined && text !== field.initial)) {
			if (text !== field.initial) query.set(key, text.trim());
		}
		if (unit && 'unit' in field && unit !== field.unit[system]) query.set(`${key}.u`, unit);
	}
	return query.toString();
}

/** A form sent without script names each cell `key.row.column`. */
function cellsByName(query: URLSearchParams, key: string): string | undefined {
	const cells: string[][] = [];
	for (const [name, value] of query) {
		const at = /^(.+)\.(\d{1,2})\.(\d{1,2})$/.exec(name);
		if (!at || at[1] !== key) continue;
		const [row, column] = [Number(at[2]), Number(at[3])];
		if (row >= mostCells || column >= mostCells) continue;
		(cells[row] ??= [])[column] = value;
	}
	if (cells.length === 0) return undefined;
	return textOf(
		Array.from(cells, (row: string[] | undefined) =>
			Array.from(row ?? [], (one: string | undefined) => one ?? '')
		)
	);
}
