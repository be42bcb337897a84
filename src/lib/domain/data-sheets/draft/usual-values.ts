/** Part families and dimensions that a teardown usually asks for, to be taken with one press. */
type UsualFamily = { key: string; words: string; dimensions: readonly UsualDimension[] };
export type UsualDimension = {
	key: string;
	words: string;
	/** Millimetres when left out. */
	unit?: string;
	decimals: string;
};

const mm3 = (key: string, words: string): UsualDimension => ({ key, words, decimals: '3' });
const mm2 = (key: string, words: string): UsualDimension => ({ key, words, decimals: '2' });

/** The keys are those that job sheets ask for, so that a sheet made of them serves at once. */
export const usualFamilies: readonly UsualFamily[] = [
	{
		key: 'cylinder',
		words: 'Block and bores',
		dimensions: [
			mm3('cylinder.bore', 'Cylinder bore, diameter'),
			mm3('cylinder.outOfRound', 'Cylinder bore, out-of-round'),
			mm3('cylinder.taper', 'Cylinder bore, taper'),
			mm2('cylinder.deckFlatness', 'Block deck, flatness overall')
		]
	},
	{
		key: 'piston',
		words: 'Pistons and pins',
		dimensions: [
			mm3('piston.diameter', 'Piston skirt, diameter'),
			mm3('piston.clearance', 'Piston to bore, clearance'),
			mm3('piston.pin', 'Piston pin, diameter')
		]
	},
	{
		key: 'ring',
		words: 'Piston rings',
		dimensions: [
			mm2('ring.topGap', 'Top ring, end gap in the bore'),
			mm2('ring.secondGap', 'Second ring, end gap in the bore'),
			mm2('ring.topSideClearance', 'Top ring, side clearance in its groove')
		]
	},
	{
		key: 'crankshaft',
		words: 'Crankshaft',
		dimensions: [
			{ key: 'crankshaft.stroke', words: 'Stroke', decimals: '1' },
			mm2('crankshaft.endFloat', 'Crankshaft, end float'),
			mm2('crankshaft.runout', 'Crankshaft, runout at the middle journal')
		]
	},
	{
		key: 'crankpin',
		words: 'Crankpins and big ends',
		dimensions: [
			mm3('crankpin.diameter', 'Crankpin, diameter'),
			mm3('crankpin.outOfRound', 'Crankpin, out-of-round'),
			mm3('crankpin.taper', 'Crankpin, taper'),
			mm3('crankpin.bearingBore', 'Big-end bearing bore, shells in, cap tightened'),
			mm3('crankpin.oilClearance', 'Crankpin, oil clearance'),
			mm2('crankpin.sideClearance', 'Big end, side clearance on the pin')
		]
	},
	{
		key: 'mainJournal',
		words: 'Main journals and bearings',
		dimensions: [
			mm3('mainJournal.diameter', 'Main journal, diameter'),
			mm3('mainJournal.outOfRound', 'Main journal, out-of-round'),
			mm3('mainJournal.bearingBore', 'Main bearing bore, shells in, cap tightened'),
			mm3('mainJournal.oilClearance', 'Main journal, oil clearance')
		]
	},
	{
		key: 'head',
		words: 'Cylinder head',
		dimensions: [
			mm2('head.flatness', 'Cylinder head face, flatness overall'),
			mm2('head.height', 'Cylinder head, height'),
			mm2('head.gasketThickness', 'Head gasket, fitted thickness')
		]
	},
	{
		key: 'valve',
		words: 'Valves and guides',
		dimensions: [
			mm2('valve.inletLash', 'Inlet valve lash, cold'),
			mm2('valve.exhaustLash', 'Exhaust valve lash, cold'),
			mm3('valve.inletStem', 'Inlet valve stem, diameter'),
			mm3('valve.inletGuide', 'Inlet valve guide, bore'),
			mm3('valve.inletStemClearance', 'Inlet valve, stem to guide, clearance')
		]
	},
	{
		key: 'oil',
		words: 'Lubrication',
		dimensions: [
			{
				key: 'oil.reliefOpening',
				words: 'Oil pressure relief valve, opening pressure',
				unit: 'bar',
				decimals: '1'
			}
		]
	}
];

/** With these six a class can measure a crankpin and a bore on the day the sheet is begun. */
export const firstSix: readonly string[] = [
	'cylinder.bore',
	'crankshaft.stroke',
	'crankpin.diameter',
	'crankpin.bearingBore',
	'crankpin.oilClearance',
	'crankpin.outOfRound'
];
