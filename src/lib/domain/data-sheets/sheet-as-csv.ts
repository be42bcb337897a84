import type { DataSheet } from './schema';
import { stageWords, unitWords } from './unit-words';

/** The table's columns: one row a thing of the sheet, of whatever kind. */
const columns = [
	'kind',
	'key',
	'words',
	'unit',
	'nominal',
	'build least',
	'build most',
	'run again least',
	'run again most',
	'says',
	'source',
	'page'
] as const;
type Cell = string | number | undefined;
type Row = Partial<Record<(typeof columns)[number], Cell>>;

/**
 * A sheet as one table (RFC 4180, lines ended by CRLF): every dimension with its limits in columns
 * of their own, so that a spreadsheet can compute with them; what is no figure stands under `says`.
 * Figures have a point as decimal mark. A cell that a spreadsheet would take for a formula is
 * written behind an apostrophe.
 */
export function sheetAsCsv(sheet: DataSheet): string {
	const rows: Row[] = [
		...sheet.dimensions.map((one) => {
			const fixed = (value: number | undefined) => value?.toFixed(one.decimals);
			return {
				kind: 'dimension',
				key: one.key,
				words: one.words,
				unit: unitWords[one.unit],
				nominal: fixed(one.nominal),
				'build least': fixed(one.build?.least),
				'build most': fixed(one.build?.most),
				'run again least': fixed(one.runAgain?.least),
				'run again most': fixed(one.runAgain?.most),
				says: one.note,
				source: one.source,
				page: one.page
			};
		}),
		...sheet.fasteners.map((one) => ({
			kind: 'fastener',
			key: one.key,
			words: one.words,
			says: `M${one.thread.diameterMm} × ${one.thread.pitchMm}, ${one.propertyClass}; ${stageWords(one.stages)}; ${one.lubrication}; ${one.reuse}`,
			source: one.source,
			page: one.page
		})),
		...sheet.patterns.flatMap((one) =>
			one.bolts.map((bolt) => ({
				kind: 'bolt',
				key: one.key,
				words: `${one.words}: ${bolt.id}`,
				unit: 'mm',
				says: `x ${bolt.xMm}, y ${bolt.yMm}${one.printedOrder ? `; place ${one.printedOrder.indexOf(bolt.id) + 1} of the printed order` : ''}`
			}))
		),
		...sheet.oversizes.map((one) => ({
			kind: one.kind,
			key: one.key,
			words: one.words,
			unit: 'mm',
			says: `${one.of}: ${one.stepsMm.join('; ')}`,
			source: one.source,
			page: one.page
		})),
		...sheet.shims.map((one) => ({
			kind: 'shims',
			key: one.key,
			words: one.words,
			unit: 'mm',
			says: `${one.fromMm} to ${one.toMm} by ${one.stepMm}`,
			source: one.source,
			page: one.page
		})),
		...sheet.fluids.map((one) => ({
			kind: 'fluid',
			words: one.words,
			says: `${one.amount}; ${one.kind}`
		})),
		...sheet.ports.map((one) => ({
			kind: `${one.carries} way`,
			key: one.key,
			words: one.words,
			unit: one.diameterMm === undefined ? undefined : 'mm',
			nominal: one.diameterMm,
			says: [`${one.from} to ${one.to}`, one.note].filter(Boolean).join('; '),
			source: one.source,
			page: one.page
		})),
		...sheet.weakPoints.map((one) => ({
			kind: 'weak point',
			key: one.key,
			words: one.words,
			says: `Fails: ${one.fails} Shows: ${one.shows} Check: ${one.check}`,
			source: one.source,
			page: one.page
		}))
	];
	const lines = [[...columns], ...rows.map((row) => columns.map((column) => row[column]))];
	return lines.map((line) => line.map(cell).join(',') + '\r\n').join('');
}

function cell(value: Cell): string {
	if (value === undefined) return '';
	const text = String(value);
	const safe = /^[=+@\t\r]|^-(?![\d.])/.test(text) ? `'${text}` : text;
	return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
