import {
	nutFactors,
	type Lubrication,
	type NutFactorRange
} from '$lib/kernel/fasteners/nut-factor';
import type { Fastener } from './schema';

/** What a sheet's words for a lubrication mean; the first that fits. */
const byWords: readonly [RegExp, Lubrication][] = [
	[/anti-?seize|molybd|paste/i, 'anti-seize'],
	[/wax/i, 'waxed'],
	[/oil|grease/i, 'oiled'],
	[/zinc/i, 'zinc']
];

/** A fastener's lubrication by its words; dry where none of them is known. */
export function lubricationOf({ lubrication }: Pick<Fastener, 'lubrication'>): Lubrication {
	return byWords.find(([shape]) => shape.test(lubrication))?.[1] ?? 'dry';
}

/** What a fastener's nut factor may be: its own where the sheet gives it, else by its lubrication. */
export function nutFactorOf(fastener: Pick<Fastener, 'nutFactor' | 'lubrication'>): NutFactorRange {
	return fastener.nutFactor ?? nutFactors[lubricationOf(fastener)];
}
