import { pistonDeck, pistonToHeadMm } from '$lib/kernel/cylinder/block-stack';
import { compressionRatio as ratioFrom } from '$lib/kernel/cylinder/compression-ratio';
import { skimmedChamberCm3 } from '$lib/kernel/cylinder/skimming';
import { solvePart } from '$lib/kernel/cylinder/solve-part';
import { cannot, computed } from '$lib/kernel/outcome';
import type { DataSheet } from '../../data-sheets/schema';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import type { ResultLine } from '../worked';
import { cm3, middleNumber, middleOf, ratioLetters, stated } from './cylinder/faces';
import { ratioFields, solvedWords } from './cylinder/ratio-fields';
import { ratioSteps, skimSteps, solvedSteps } from './cylinder/ratio-steps';

/** Compression ratio from the parts above a piston, and each part for a wanted ratio. */
export const compressionRatio = calculator({
	key: 'compression-ratio',
	title: 'Compression ratio',
	says: 'Compression ratio from chamber, gasket, deck and crown, after a skim if there was one, and any one of them solved for the ratio that is wanted.',
	drawer: 'cylinder',
	caution:
		'A ratio above the maker’s knocks on the fuel that the engine was made for. After skimming, valves and pistons come closer: measure that room as well.',
	formulas: [
		'cylinder/displacement',
		'cylinder/disc-volume',
		'cylinder/skimmed-chamber',
		'cylinder/compression-ratio',
		'cylinder/clearance-for',
		'cylinder/solve-part',
		'cylinder/disc-height',
		'cylinder/piston-to-head'
	],
	fields: ratioFields,
	work({
		bore,
		stroke,
		chamber,
		cut,
		opening,
		gasketBore,
		gasket,
		deck,
		crown,
		crevice,
		...asked
	}) {
		if ((cut === undefined) !== (opening === undefined))
			return cannot(
				'a skim is known by its cut and by the chamber’s opening at the face: give both'
			);
		const skimmed =
			cut === undefined || opening === undefined
				? undefined
				: { cut, opening, found: skimmedChamberCm3(chamber, opening, cut) };
		if (skimmed && !skimmed.found.ok) return skimmed.found;
		const cylinder = { boreMm: bore, strokeMm: stroke };
		const parts = {
			chamberCm3: skimmed?.found.ok ? skimmed.found.value : chamber,
			gasketBoreMm: gasketBore,
			gasketMm: gasket,
			deckMm: deck,
			crownCm3: crown,
			...(crevice === undefined ? {} : { creviceCm3: crevice })
		};
		const found = ratioFrom(cylinder, parts);
		if (!found.ok) return found;
		const room = pistonToHeadMm(gasket, deck);
		if (!room.ok) return room;
		const { ratio, sweptCm3, clearanceCm3, gasketCm3, deckCm3 } = found.value;
		const lines: ResultLine[] = [
			{ key: 'ratio', ...ratioLetters, value: ratio, main: true },
			{ key: 'clearance', words: 'Clearance volume', value: clearanceCm3, ...cm3 },
			{ key: 'swept', words: 'Swept volume', value: sweptCm3, unit: 'cm³', decimals: 1 },
			{
				key: 'room',
				words: 'Room between the flats of piston and head',
				value: room.value,
				unit: 'mm',
				decimals: 2
			}
		];
		const working: Step[] = [
			...(skimmed ? skimSteps(chamber, skimmed.opening, skimmed.cut, parts.chamberCm3) : []),
			...ratioSteps(cylinder, parts, found.value)
		];
		const { wanted, part } = asked;
		if (wanted !== undefined) {
			const answer = solvePart(cylinder, parts, part, wanted);
			if (!answer.ok) return cannot(`for ${wanted} to 1: ${answer.because}`);
			lines.push({ key: 'solved', ...solvedWords[part], value: answer.value.value, main: true });
			working.push(...solvedSteps(part, wanted, answer.value));
		}
		return computed({
			lines,
			working,
			notes:
				room.value <= 0
					? ['With these sizes the piston strikes the head. Read the deck and the gasket again.']
					: [],
			drawing: {
				kind: 'cylinder-volumes',
				boreMm: bore,
				strokeMm: stroke,
				gasketMm: gasket,
				gasketBoreMm: gasketBore,
				deckMm: deck,
				ratio,
				parts: [
					{ key: 'chamber', words: 'Chamber', cm3: parts.chamberCm3 },
					{ key: 'gasket', words: 'Gasket', cm3: gasketCm3 },
					{ key: 'deck', words: 'Deck', cm3: deckCm3 },
					{ key: 'crown', words: crown < 0 ? 'Dome' : 'Dish', cm3: crown },
					...(crevice === undefined
						? []
						: [{ key: 'crevice' as const, words: 'Ring land', cm3: crevice }])
				],
				clearanceCm3,
				sweptCm3
			}
		});
	},
	presets: (sheet) => {
		const values = stated({
			bore: middleOf(sheet, 'cylinder.bore'),
			stroke: middleOf(sheet, 'crankshaft.stroke'),
			chamber: middleOf(sheet, 'head.chamberVolume'),
			gasket: middleOf(sheet, 'head.gasketThickness'),
			crown: middleOf(sheet, 'piston.dish') ?? middleOf(sheet, 'piston.bowl'),
			deck: deckOf(sheet)
		});
		return values.bore && values.stroke
			? [{ key: 'cylinder.bore', words: 'One cylinder, middle of its sizes', values }]
			: [];
	}
});

/** From block, piston, rod and stroke where the sheet has all four. */
function deckOf(sheet: DataSheet): string | undefined {
	const [blockHeight, compressionHeight, rod, stroke] = [
		'cylinder.deckHeight',
		'piston.compressionHeight',
		'rod.length',
		'crankshaft.stroke'
	].map((key) => middleNumber(sheet, key));
	if (!blockHeight || !compressionHeight || !rod || !stroke) return undefined;
	const deck = pistonDeck({ blockHeight, compressionHeight, rod, stroke });
	return deck.ok ? String(Number(deck.value.toFixed(3))) : undefined;
}
