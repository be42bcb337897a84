import { unitWords } from '../unit-words';
import type { SheetDraft } from './draft';
import type { RowSection } from './sections';

type Values = Readonly<Record<string, string>>;

/** What a row is called in a list, as far as it is typed; a fit by the clearance that it gives. */
export function rowTitle(section: RowSection, values: Values, draft?: SheetDraft): string {
	const { clearance = '', words = '' } = values;
	const gap = draft?.rows.dimensions.find((one) => one.values.key === clearance)?.values.words;
	const named = section === 'fits' ? (gap ?? clearance) : words;
	return named.trim() || 'Not named yet';
}

/** What a row says, in one line, as far as it is typed. */
export function rowSays(section: RowSection, values: Values): string {
	const said = says[section](values).filter((one): one is string => Boolean(one));
	return said.join(' · ');
}

const range = (least = '', most = '') =>
	least || most ? (least && most ? `${least}–${most}` : least || most) : '';

const says: Record<RowSection, (values: Values) => (string | undefined)[]> = {
	partFamilies: ({ key, material }) => [key, material],
	dimensions({ nominal, least, most, wearLeast, wearMost, unit = 'mm' }) {
		const build = range(least, most) || nominal;
		const mark = unitWords[unit as keyof typeof unitWords] ?? '';
		return [
			build && `${build} ${mark}`.trim(),
			wearLeast && `not below ${wearLeast}`,
			wearMost && `not above ${wearMost}`
		];
	},
	fits: ({ outer, inner }) => [outer && inner && `${outer} − ${inner}`],
	fasteners: ({ thread, propertyClass, stages }) => [
		[thread, propertyClass].filter(Boolean).join(', '),
		stages
	],
	patterns({ bolts = '', printedOrder = '' }) {
		const count = bolts.split('\n').filter((one) => one.trim()).length;
		return [count > 0 ? `${count} bolts` : undefined, printedOrder && 'order printed'];
	},
	oversizes: ({ of, stepsMm }) => [of, stepsMm && `${stepsMm} mm`],
	shims: ({ fromMm, toMm, stepMm }) => [
		fromMm && toMm && `${fromMm}–${toMm} mm`,
		stepMm && `by ${stepMm} mm`
	],
	fluids: ({ amount, kind }) => [amount, kind],
	ports: ({ carries, from, to }) => [carries, from && to && `${from} to ${to}`],
	weakPoints: ({ family }) => [family]
};
