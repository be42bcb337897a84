import { dimensionUnits } from '../schema/dimension';
import { propertyClasses } from '../schema/fastener';
import { unitWords } from '../unit-words';
import { boltRows } from './bolt-rows';
import { counts, figures, names, stages, thread, whole } from './codecs';
import { check, choice, figure, line, long, oneOf, type Field } from './field';

export type Section = {
	title: string;
	/** One row of it, in words: "a dimension". */
	one: string;
	fields: Record<string, Field>;
};

const same = (value: string) => ({ value, words: value });
const from = {
	source: line('Source', 'source', { hint: 'Which manual, or whose measurement.' }),
	page: line('Page', 'page', { short: true })
};
const key = line('Key', 'key', {
	hint: 'How lessons and questions name it: part family, point, name.',
	late: true
});
const words = line('Words', 'words');

export const head: Record<string, Field> = {
	code: line('Code', 'code', { short: true }),
	title: line('Title', 'title'),
	drawnBy: line('Drawn by', 'drawnBy'),
	public: check('Public', 'public', 'Anybody may read it, and the tool crib offers its values.'),
	cylinders: figure('Cylinders', 'layout.cylinders', undefined, { codec: whole }),
	cycle: choice('Cycle', 'layout.cycle', [
		{ value: 'four-stroke', words: 'four-stroke' },
		{ value: 'two-stroke', words: 'two-stroke' }
	]),
	ignition: choice('Ignition', 'layout.ignition', [
		{ value: 'spark', words: 'by spark' },
		{ value: 'compression', words: 'by compression' }
	]),
	firingOrder: line('Firing order', 'layout.firingOrder', { codec: counts, hint: 'As 1 3 4 2.' })
};

/** Everything of a sheet that stands in rows. */
export const sections = {
	partFamilies: {
		title: 'Part families',
		one: 'a part family',
		fields: {
			words,
			key: line('Key', 'key', { hint: 'The first word of its values’ keys.', late: true }),
			material: line('Material', 'material'),
			expansionPerK: figure('Linear expansion', 'expansionPerK', '1/K')
		}
	},
	dimensions: {
		title: 'Dimensions',
		one: 'a dimension',
		fields: {
			words,
			nominal: figure('Nominal', 'nominal', 'row'),
			unit: choice(
				'Unit',
				'unit',
				dimensionUnits.map((value) => ({ value, words: unitWords[value] || value }))
			),
			least: figure('To build, least', 'build.least', 'row'),
			most: figure('To build, most', 'build.most', 'row'),
			wearLeast: figure('To run again, not below', 'runAgain.least', 'row'),
			wearMost: figure('To run again, not above', 'runAgain.most', 'row'),
			...from,
			decimals: choice('Decimals', 'decimals', ['0', '1', '2', '3', '4'].map(same), {
				codec: whole
			}),
			note: line('Note', 'note'),
			key
		}
	},
	fits: {
		title: 'Fits',
		one: 'a fit',
		fields: {
			clearance: oneOf('Clearance', 'clearance', 'dimensions'),
			outer: oneOf('Outer size, such as the bore', 'outer', 'dimensions'),
			inner: oneOf('Inner size, such as the pin', 'inner', 'dimensions'),
			selective: check(
				'Fitted selectively',
				'selective',
				'Graded and paired: the two sizes alone do not give the clearance.'
			)
		}
	},
	fasteners: {
		title: 'Fasteners',
		one: 'a fastener',
		fields: {
			words,
			thread: line('Thread', 'thread', { codec: thread, short: true, hint: 'As M10 × 1.25.' }),
			propertyClass: choice('Class', 'propertyClass', propertyClasses.map(same)),
			stages: line('Tighten', 'stages', { codec: stages, hint: 'As 30 Nm + 90° + 90°.' }),
			yieldTightened: check('Tightened into yield', 'yieldTightened'),
			lubrication: line('Lubrication', 'lubrication'),
			reuse: line('Fitted again', 'reuse', { hint: 'As “use again if sound” or “new each time”.' }),
			count: figure('How many', 'count', undefined, { codec: whole }),
			drive: line('Drive', 'drive', { short: true }),
			gripMm: figure('Grip length', 'gripMm', 'mm'),
			nutFactorLeast: figure('Nut factor, least', 'nutFactor.least'),
			nutFactorMost: figure('Nut factor, most', 'nutFactor.most'),
			...from,
			key
		}
	},
	patterns: {
		title: 'Bolt patterns',
		one: 'a bolt pattern',
		fields: {
			words,
			fastener: oneOf('Fastener', 'fastener', 'fasteners'),
			bolts: {
				label: 'Bolts',
				path: 'bolts',
				codec: boltRows,
				input: 'table',
				hint: 'One a line: name, x and y in mm from the pattern’s middle. Lines can be pasted.'
			},
			printedOrder: line('Tightening order', 'printedOrder', {
				codec: names,
				hint: 'Bolt by bolt, as the maker prints it.'
			}),
			key
		}
	},
	oversizes: {
		title: 'Oversizes',
		one: 'a row of oversizes',
		fields: {
			words,
			of: oneOf('Of', 'of', 'dimensions'),
			kind: choice('Kind', 'kind', [same('oversize'), same('undersize')]),
			stepsMm: line('Steps, mm', 'stepsMm', { codec: figures, hint: 'As 0.25 0.50.' }),
			...from,
			key
		}
	},
	shims: {
		title: 'Shims',
		one: 'a range of shims',
		fields: {
			words,
			fromMm: figure('Thinnest', 'fromMm', 'mm'),
			toMm: figure('Thickest', 'toMm', 'mm'),
			stepMm: figure('Step', 'stepMm', 'mm'),
			...from,
			key
		}
	},
	fluids: {
		title: 'Fluids',
		one: 'a fluid',
		fields: { words, amount: line('Amount', 'amount', { short: true }), kind: line('Kind', 'kind') }
	},
	ports: {
		title: 'Ports',
		one: 'a port',
		fields: {
			words,
			carries: choice('Carries', 'carries', ['oil', 'coolant', 'fuel', 'air'].map(same)),
			from: line('From', 'from'),
			to: line('To', 'to'),
			diameterMm: figure('Diameter', 'diameterMm', 'mm'),
			...from,
			note: line('Note', 'note'),
			key
		}
	},
	weakPoints: {
		title: 'Weak points',
		one: 'a weak point',
		fields: {
			words,
			family: oneOf('Part family', 'family', 'partFamilies'),
			fails: long('What fails', 'fails'),
			shows: long('How it shows', 'shows'),
			check: long('What to check', 'check'),
			...from,
			key
		}
	}
} as const satisfies Record<string, Section>;

export type RowSection = keyof typeof sections;
export type SectionName = RowSection | 'head';
export const rowSections = Object.keys(sections) as RowSection[];

export function fieldsOf(section: SectionName): Record<string, Field> {
	return section === 'head' ? head : sections[section].fields;
}
