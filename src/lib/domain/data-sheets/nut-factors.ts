import type { Fastener } from './schema';

type Range = { least: number; most: number };

/**
 * Nut factors that bracket a lubrication, by its words; the first that fits.
 * Source: typical values of textbooks and supplier tables (references K-a to K-k); they differ
 * between sources, so each is a range.
 */
const byWords: readonly [RegExp, Range][] = [
	[/anti-?seize|molybd|paste/i, { least: 0.12, most: 0.16 }],
	[/wax/i, { least: 0.1, most: 0.14 }],
	[/oil|grease/i, { least: 0.15, most: 0.2 }],
	[/zinc/i, { least: 0.2, most: 0.25 }]
];
const dry: Range = { least: 0.18, most: 0.25 };

/** What a fastener's nut factor may be: its own where the sheet gives it, else by its lubrication. */
export function nutFactorOf({
	nutFactor,
	lubrication
}: Pick<Fastener, 'nutFactor' | 'lubrication'>): Range {
	return nutFactor ?? byWords.find(([shape]) => shape.test(lubrication))?.[1] ?? dry;
}
