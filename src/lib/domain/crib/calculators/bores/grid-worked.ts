import { extremesOf, type PlacedReading } from '$lib/kernel/geometry/grid-shape';
import type { DiameterGrid } from '$lib/kernel/geometry/diameter-grid';
import { wearMm } from '$lib/kernel/geometry/wear';
import { ofWeightedReadingsMm } from '$lib/kernel/geometry/weighted-readings';
import { expectedSpread } from '$lib/kernel/measurement/expected-spread';
import { coverageFactor } from '$lib/kernel/measurement/uncertainty';
import { computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../../working';
import type { ResultLine, Worked } from '../../worked';
import { figure } from '../formula-figures';
import { mm } from './faces';
import { roundOf, shapeShown, spreadStep, taperOf, type Part } from './grid-shape';
import { nextSizeShown } from './next-size-shown';
import { limitsOf, ruledBetween } from './ruled-between';

export type GridAsked = {
	readings: (number | null)[][];
	/** Standard size and what it can be machined to. */
	nominal: number | undefined;
	steps: number[] | undefined;
	stock: number | undefined;
	/** The printed size on the side that it wears to, and its wear limit. */
	printed: number | undefined;
	wearLimit: number | undefined;
	outOfRoundMost: number | undefined;
	taperMost: number | undefined;
	uncertainty: number | undefined;
};

/** A bore or journal from its readings: form, wear, next size, rulings. */
export function gridWorked(part: Part, asked: GridAsked): Outcome<Worked> {
	const found = extremesOf(asked.readings);
	if (!found.ok) return found;
	const rows = asked.readings as readonly (readonly number[])[];
	const { least, most } = found.value;
	const [worst, other] = part === 'bore' ? [most, least] : [least, most];
	const form = formShown(part, rows, asked.uncertainty);
	if (!form.ok) return form;
	const { round, taper, differenceU, ...shown } = form.value;
	const wear = wearShown(part, worst, asked.printed);
	if (!wear.ok) return wear;
	const next = nextSizeShown(part, {
		worstMm: worst.valueMm,
		nominalMm: asked.nominal,
		stepsMm: asked.steps,
		stockMm: asked.stock
	});
	const limit = asked.wearLimit;
	const rulings = ruledBetween([
		{
			of: `${sideWords(part)[0]} reading`,
			valueMm: worst.valueMm,
			expandedMm: asked.uncertainty,
			'run-again': part === 'bore' ? limitsOf(undefined, limit) : limitsOf(limit, undefined)
		},
		...(round
			? [spreadHeld('Out-of-round', round.valueMm, differenceU, asked.outOfRoundMost)]
			: []),
		...(taper ? [spreadHeld('Taper', taper.valueMm, differenceU, asked.taperMost)] : [])
	]);
	if (!rulings.ok) return rulings;
	const [worstWords, otherWords] = sideWords(part);
	return computed({
		lines: [
			{
				key: 'worst',
				words: `${worstWords}, ${placeWords(worst)}`,
				value: worst.valueMm,
				...mm,
				main: true
			},
			{ key: 'other', words: `${otherWords}, ${placeWords(other)}`, value: other.valueMm, ...mm },
			...shown.lines,
			...wear.value.lines,
			...next.lines
		],
		working: [
			...shown.working,
			...wear.value.working,
			...next.working,
			...differenceStep(asked.uncertainty, differenceU, rulings.value.length > 0)
		],
		rulings: rulings.value,
		notes: shown.notes,
		drawing: {
			kind: 'grid-section',
			part,
			rows,
			leastMm: least.valueMm,
			mostMm: most.valueMm,
			worst: { depth: worst.depth, plane: worst.plane }
		}
	});
}

function formShown(part: Part, grid: DiameterGrid, uncertainty: number | undefined) {
	const rows = grid as readonly (readonly number[])[];
	const [round, taper] = [roundOf(rows), taperOf(rows)];
	const differenceU =
		uncertainty === undefined ? undefined : ofWeightedReadingsMm([1, -1], uncertainty);
	if (differenceU && !differenceU.ok) return differenceU;
	const shape = shapeShown(part, grid, differenceU?.value ?? 0);
	const lines: ResultLine[] = [];
	const working: Step[] = [];
	const notes: string[] = [];
	if (round) {
		lines.push({
			key: 'out-of-round',
			words: 'Out-of-round',
			value: round.valueMm,
			...mm,
			main: true
		});
		working.push(
			spreadStep(
				`Out-of-round: the planes of depth ${round.at + 1}, which differ most`,
				'largest − smallest at one depth',
				round
			)
		);
		const bias = biasNote(rows[0]?.length ?? 2, uncertainty);
		if (!bias.ok) return bias;
		notes.push(...bias.value);
	} else notes.push('Out-of-round is not judged: read a second plane, square to the first.');
	if (taper) {
		lines.push({ key: 'taper', words: 'Taper', value: taper.valueMm, ...mm, main: true });
		working.push(
			spreadStep(
				`Taper: the depths of plane ${taper.at + 1}, which differ most`,
				'largest − smallest in one plane',
				taper
			)
		);
	} else notes.push('Taper is not judged: read a second depth.');
	return computed({
		round,
		taper,
		differenceU: differenceU?.value,
		lines: [...lines, ...shape.lines],
		working: [...working, ...shape.working],
		notes: [...notes, ...shape.notes]
	});
}

/** Readings scatter, and a largest less a smallest gathers their scatter: it comes out too large. */
function biasNote(planes: number, uncertainty: number | undefined): Outcome<string[]> {
	if (uncertainty === undefined || uncertainty === 0) return computed([]);
	const found = expectedSpread(Array<number>(planes).fill(0), uncertainty / coverageFactor);
	if (!found.ok) return found;
	return computed([
		`Scatter alone makes a largest less a smallest too large: a part that is truly round would show about ${figure(found.value)} mm at each depth, read like this.`
	]);
}

function wearShown(
	part: Part,
	worst: PlacedReading,
	printed: number | undefined
): Outcome<{ lines: ResultLine[]; working: Step[] }> {
	if (printed === undefined) return computed({ lines: [], working: [] });
	const wear = wearMm(part, worst.valueMm, printed);
	if (!wear.ok) return wear;
	const [from, less] = part === 'bore' ? [worst.valueMm, printed] : [printed, worst.valueMm];
	return computed({
		lines: [{ key: 'wear', words: 'Wear beyond the printed size', value: wear.value, ...mm }],
		working: [
			{
				words:
					wear.value > 0
						? 'Wear beyond the printed size'
						: 'It lies within what is printed: no wear',
				rule: part === 'bore' ? 'largest − printed most' : 'printed least − smallest',
				...(wear.value > 0 ? { formula: `${figure(from)} − ${figure(less)}` } : {}),
				value: wear.value,
				...mm
			}
		]
	});
}

function differenceStep(
	reading: number | undefined,
	difference: number | undefined,
	isRuled: boolean
): Step[] {
	if (reading === undefined || difference === undefined || !isRuled) return [];
	return [
		{
			words: 'Uncertainty of a difference of two readings: both count',
			rule: 'U = U1 · √(1² + 1²)',
			formula: `${figure(reading, 4)} · √(1² + 1²)`,
			value: difference,
			unit: 'mm',
			decimals: 4
		}
	];
}

function spreadHeld(
	of: string,
	valueMm: number,
	expandedMm: number | undefined,
	most: number | undefined
) {
	return { of, valueMm, expandedMm, 'run-again': limitsOf(undefined, most) };
}

function sideWords(part: Part): [worst: string, other: string] {
	return part === 'bore' ? ['Largest', 'Smallest'] : ['Smallest', 'Largest'];
}

function placeWords({ depth, plane }: PlacedReading): string {
	return `depth ${depth + 1}, plane ${plane + 1}`;
}
