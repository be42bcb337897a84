import type { DimensionName, UnitOf } from './units';

type Spelling<D extends DimensionName> = readonly [RegExp, UnitOf<D>];

/** What may stand between the two halves of a torque unit. */
const joint = '[·⋅.*\\s-]{0,2}';
const pound = '(lbf?s?|pounds?)';
const foot = '(ft|foot|feet)';
const inch = '(in|inch|inches)';
const either = (a: string, b: string) => new RegExp(`^(${a}${joint}${b}|${b}${joint}${a})$`, 'i');

/** How people write the units that we know, by dimension. */
export const spellings: { readonly [D in DimensionName]: readonly Spelling<D>[] } = {
	length: [
		[/^(mm|millimet(er|re)s?)$/i, 'mm'],
		[/^(µm|μm|um|microns?|micromet(er|re)s?)$/i, 'µm'],
		[/^(in\.?|inch|inches|"|″)$/i, 'in'],
		[/^(thou|thous|mil|mils)$/i, 'thou']
	],
	torque: [
		[new RegExp(`^(n|newton)${joint}(m|met(er|re)s?)$`, 'i'), 'N·m'],
		[either(pound, foot), 'lbf·ft'],
		[either(pound, inch), 'lbf·in'],
		[either('kgf?', 'm'), 'kgf·m']
	],
	force: [
		[/^(n|newtons?)$/i, 'N'],
		[/^kn$/i, 'kN'],
		[/^(lbf?s?|pounds?)$/i, 'lbf'],
		[/^kgf?$/i, 'kgf']
	],
	pressure: [
		[/^mpa$/i, 'MPa'],
		[/^kpa$/i, 'kPa'],
		[/^bars?$/i, 'bar'],
		[/^psi$/i, 'psi']
	]
};
