import { cannot, computed, type Outcome } from '../outcome';
import { dimensions, type DimensionName } from './units';

export type Quantity = { value: number; unit: string };

/** How people write the units that we know, by dimension. */
const spellings: Record<DimensionName, readonly (readonly [RegExp, string])[]> = {
	length: [
		[/^(mm|millimet(er|re)s?)$/i, 'mm'],
		[/^(µm|μm|um|microns?)$/i, 'µm'],
		[/^(in|inch|inches|")$/i, 'in'],
		[/^(thou|mil|mils)$/i, 'thou']
	],
	torque: [
		[/^(n[·.\s-]?m)$/i, 'N·m'],
		[/^((lbf?|pounds?)[·.\s-]?(ft|feet|foot)|(ft|foot)[·.\s-]?(lbf?s?|pounds?))$/i, 'lbf·ft'],
		[/^((lbf?)[·.\s-]?(in)|(in)[·.\s-]?(lbf?s?))$/i, 'lbf·in'],
		[/^(kgf?[·.\s-]?m|m[·.\s-]?kgf?)$/i, 'kgf·m']
	],
	force: [
		[/^n$/i, 'N'],
		[/^kn$/i, 'kN'],
		[/^lbf?$/i, 'lbf'],
		[/^kgf?$/i, 'kgf']
	],
	pressure: [
		[/^mpa$/i, 'MPa'],
		[/^kpa$/i, 'kPa'],
		[/^bar$/i, 'bar'],
		[/^psi$/i, 'psi']
	]
};

/**
 * A value with its unit as a person types it: "0,045 mm", "1.5 thou", "18 ft-lb".
 *
 * @param fallback the unit meant when none is typed; without one, a bare number is refused
 * @returns value and unit as typed, not converted; "cannot" with the reason
 * @example parseQuantity('18 ft-lb', 'torque') // { value: 18, unit: 'lbf·ft' }
 */
export function parseQuantity(
	typed: string,
	dimension: DimensionName,
	fallback?: string
): Outcome<Quantity> {
	const found = /^([+-]?[\d.,\s]*\d)\s*(.*)$/.exec(typed.trim().replace(/\u2212/g, '-'));
	if (!found) return cannot('there is no number in it');
	const value = numberIn((found[1] ?? '').replace(/\s/g, ''));
	if (value === undefined) return cannot('it can be read in two ways: write one decimal mark only');
	const words = (found[2] ?? '').trim();
	if (words === '')
		return fallback ? computed({ value, unit: fallback }) : cannot('say the unit as well');
	const unit = spellings[dimension].find(([pattern]) => pattern.test(words))?.[1];
	if (!unit)
		return cannot(
			`“${words}” is no unit of ${dimension}: use ${Object.keys(dimensions[dimension]).join(', ')}`
		);
	return computed({ value, unit });
}

/** One decimal mark, comma or point. Both in one number could mean two things. */
function numberIn(text: string): number | undefined {
	if ((text.match(/[.,]/g) ?? []).length > 1) return undefined;
	const value = Number(text.replace(',', '.'));
	return Number.isFinite(value) ? value : undefined;
}
