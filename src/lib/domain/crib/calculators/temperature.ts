import { alloysDifferBy, expansionPerK, materials } from '$lib/kernel/geometry/expansion';
import {
	at20Mm,
	growthApartMm,
	growthMm,
	growthOf,
	readingOfMm,
	type Body
} from '$lib/kernel/geometry/temperature';
import { computed } from '$lib/kernel/outcome';
import type { DataSheet } from '../../data-sheets/schema';
import { calculator, type Preset } from '../calculator';
import { choice, number, quantity } from '../field';
import { bracketed, figure, plain } from './formula-figures';
import { allOf } from './temperature/all-of';
import { expandedAt20, ruledAt20, type Warm } from './temperature/ruled';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' }, decimals: 3 } as const;
const size = { ...length, least: 0.1, most: 5000 } as const;
const warmth = {
	dimension: 'temperature',
	unit: { metric: '°C', inch: '°F' },
	decimals: 0,
	least: -30,
	most: 200
} as const;
const material = { options: materials.map(({ key, words }) => ({ value: key, words })) } as const;

/** A reading brought to 20 °C as part minus instrument. */
export const temperature = calculator({
	key: 'temperature',
	title: 'A reading brought to 20 °C',
	says: 'What a warm or cold part would measure at 20 °C, where sizes are printed, with the instrument’s own warmth taken off.',
	drawer: 'measuring',
	caution:
		'Let part and instrument lie side by side until they are alike: that is worth more than any correction. Do not correct a part that is still cooling.',
	formulas: [
		'geometry/at-20',
		'geometry/growth',
		'geometry/reading-of',
		'measurement/temperature',
		'measurement/combined-standard',
		'measurement/ruling'
	],
	sources: ['Coefficients: published tables, taken as right to a tenth.'],
	fields: {
		reading: quantity({ ...size, words: 'Reading', example: '73.985' }),
		part: choice({ ...material, words: 'Part of', example: 'aluminium' }),
		partC: quantity({ ...warmth, words: 'Temperature of the part', example: '34' }),
		instrument: choice({
			...material,
			words: 'Instrument of',
			initial: 'gauge-steel',
			example: 'gauge-steel'
		}),
		instrumentC: quantity({ ...warmth, words: 'Temperature of the instrument', example: '24' }),
		ownPerK: number({
			words: 'Expansion of the part, millionths per °C',
			hint: 'From its data sheet. It wins over the table.',
			least: 0,
			most: 100,
			optional: true,
			example: ''
		}),
		within: quantity({
			dimension: 'temperatureDifference',
			unit: { metric: 'K', inch: '°F' },
			decimals: 1,
			least: 0,
			most: 20,
			optional: true,
			words: 'Temperatures known to within',
			example: '1'
		}),
		least: quantity({ ...size, optional: true, words: 'Printed least', example: '73.960' }),
		most: quantity({ ...size, optional: true, words: 'Printed most', example: '73.975' }),
		uncertainty: quantity({
			...length,
			least: 0,
			most: 1,
			optional: true,
			words: 'Expanded uncertainty of the reading',
			hint: 'With it and the limits the size is ruled.',
			example: '0.004'
		})
	},
	work({ reading, part, partC, instrument, instrumentC, ownPerK, ...rest }) {
		const own = ownPerK === undefined ? expansionPerK(part) : ownPerK * 1e-6;
		const warm: Warm = {
			readMm: reading,
			part: { expansionPerK: own, temperatureC: partC },
			instrument: { expansionPerK: expansionPerK(instrument), temperatureC: instrumentC },
			withinK: rest.within ?? 0
		};
		const found = allOf({
			at20: at20Mm(reading, warm.part, warm.instrument),
			correction: growthApartMm(reading, growthOf(warm.instrument), growthOf(warm.part)),
			partGrowth: growthMm(reading, growthOf(warm.part)),
			instrumentGrowth: growthMm(reading, growthOf(warm.instrument))
		});
		if (!found.ok) return found;
		const { at20, correction, partGrowth, instrumentGrowth } = found.value;
		const doubt = expandedAt20(warm, rest.uncertainty ?? 0);
		if (!doubt.ok) return doubt;
		const { expanded, parts } = doubt.value;
		const rulings = ruledAt20(at20, expanded, rest);
		if (!rulings.ok) return rulings;
		const limits = limitLines(rest, warm);
		if (!limits.ok) return limits;
		const fine = { unit: 'mm', decimals: 4 };
		const grown = (body: Body) =>
			`${plain(reading)} · ${millionths(body.expansionPerK)} · (${degrees(body.temperatureC)} − 20)`;
		return computed({
			lines: [
				{ key: 'at-20', words: 'Size at 20 °C', value: at20, unit: 'mm', decimals: 3, main: true },
				{ key: 'correction', words: 'Correction', value: correction, ...fine },
				...limits.value,
				{
					key: 'expanded',
					words: 'Expanded uncertainty of the size at 20 °C',
					value: expanded,
					...fine
				}
			],
			working: [
				{
					words: 'The part has grown by',
					rule: 'ΔLp = L · αp · (Tp − 20)',
					formula: grown(warm.part),
					value: partGrowth,
					...fine
				},
				{
					words: 'The instrument has grown by, and reads that much short',
					rule: 'ΔLs = L · αs · (Ts − 20)',
					formula: grown(warm.instrument),
					value: instrumentGrowth,
					...fine
				},
				{
					words: 'Correction: instrument less part',
					rule: 'ΔLs − ΔLp',
					formula: `${figure(instrumentGrowth, 4)} − ${bracketed(partGrowth, 4)}`,
					value: correction,
					...fine
				},
				{
					words: 'Size at 20 °C',
					rule: 'L20 = L + ΔLs − ΔLp',
					formula: `${plain(reading)} + ${bracketed(correction, 4)}`,
					value: at20,
					unit: 'mm',
					decimals: 3
				},
				{
					words: `Its uncertainty, from ${parts.map((one) => one.name.toLowerCase()).join(', ')}`,
					rule: 'U = 2 · √(Σ (sensitivity · u)²)',
					formula: `2 · √(${parts.map((one) => `${figure(Math.abs(one.sensitivity * one.standard), 5)}²`).join(' + ')})`,
					value: expanded,
					...fine
				}
			],
			rulings: rulings.value,
			notes: [
				Math.abs(correction) < 0.0005
					? 'Part and instrument nearly grow alike here: the correction is less than half a micrometre and changes nothing.'
					: `Alloys of one name differ by about ${alloysDifferBy * 100} % in their expansion, and the correction with them.`
			],
			drawing: {
				kind: 'warm',
				part: { words: wordsOf(part), temperatureC: partC, growthMm: partGrowth },
				instrument: {
					words: wordsOf(instrument),
					temperatureC: instrumentC,
					growthMm: instrumentGrowth
				},
				readMm: reading,
				at20Mm: at20
			}
		});
	},
	presets: printedSizes
});

type PrintedLimits = { least: number | undefined; most: number | undefined };

/** The printed limits as this instrument would read them now. */
function limitLines({ least, most }: PrintedLimits, { part, instrument }: Warm) {
	const lines = [
		{ key: 'least', words: 'Printed least, as it reads now', sizeMm: least },
		{ key: 'most', words: 'Printed most, as it reads now', sizeMm: most }
	].flatMap(({ sizeMm, ...one }) =>
		sizeMm === undefined ? [] : [{ ...one, found: readingOfMm(sizeMm, part, instrument) }]
	);
	const values = allOf(Object.fromEntries(lines.map(({ key, found }) => [key, found])));
	if (!values.ok) return values;
	return computed(
		lines.map(({ key, words }) => ({
			key,
			words,
			value: values.value[key] ?? 0,
			unit: 'mm',
			decimals: 3
		}))
	);
}

function printedSizes(sheet: DataSheet): Preset[] {
	return sheet.dimensions.flatMap(({ key, words, unit, nominal, build }) => {
		if (unit !== 'mm' || !build || build.least <= 0.1) return [];
		const family = sheet.partFamilies.find((one) => one.key === key.split('.')[0]);
		// A clearance or a gap is no size of one part.
		if (nominal === undefined && !/diameter|pin$|bore$|stem$|guide$|wall$|height$/i.test(key))
			return [];
		return [
			{
				key,
				words,
				values: {
					least: String(build.least),
					most: String(build.most),
					...(family?.expansionPerK === undefined
						? {}
						: { ownPerK: String(Number((family.expansionPerK * 1e6).toFixed(3))) })
				}
			}
		];
	});
}

function wordsOf(key: string): string {
	return materials.find((one) => one.key === key)?.words ?? '';
}

function millionths(perK: number): string {
	return `${Number((perK * 1e6).toFixed(2))}e-6`;
}

function degrees(valueC: number): string {
	return plain(valueC);
}
