import { keyedThings, type DataSheet, type Dimension, type Fastener, type Pattern } from './schema';
import { figureWords, stageWords } from './unit-words';

/** One thing that differs between two revisions, in words, was and now. */
export type Change = {
	key: string;
	words: string;
	what: 'added' | 'removed' | 'changed';
	was?: string;
	now?: string;
};

/** What differs between two revisions of a sheet, thing by thing, in the order of the sheet. */
export function changesBetween(before: DataSheet | undefined, after: DataSheet): Change[] {
	const was = new Map((before ? printedThings(before) : []).map((one) => [one.key, one]));
	const now = new Map(printedThings(after).map((one) => [one.key, one]));
	const keys = [...new Set([...now.keys(), ...was.keys()])];
	return keys.flatMap((key): Change[] => {
		const [a, b] = [was.get(key), now.get(key)];
		if (!b) return a ? [{ key, words: a.words, what: 'removed', was: a.printed }] : [];
		if (!a) return [{ key, words: b.words, what: 'added', now: b.printed }];
		return a.printed === b.printed
			? []
			: [{ key, words: b.words, what: 'changed', was: a.printed, now: b.printed }];
	});
}

/** The keys of what is changed or gone: what lessons, questions and job sheets are asked about. */
export function touchedKeys(changes: readonly Change[]): Set<string> {
	return new Set(changes.filter((one) => one.what !== 'added').map((one) => one.key));
}

type Printed = { key: string; words: string; printed: string };

/** Everything in a sheet as it would be printed, each under its key. */
function printedThings(sheet: DataSheet): Printed[] {
	const head: Printed[] = [
		{ key: 'title', words: 'Title', printed: `${sheet.code}, ${sheet.title}` },
		{ key: 'public', words: 'Read by anybody', printed: sheet.public ? 'yes' : 'no' },
		{ key: 'layout', words: 'Layout', printed: layoutWords(sheet) },
		...sheet.partFamilies.map((one) => ({
			key: `family ${one.key}`,
			words: one.words,
			printed: [one.words, one.material, one.expansionPerK && `${one.expansionPerK} per K`]
				.filter(Boolean)
				.join('; ')
		})),
		...sheet.fluids.map((one) => ({
			key: `fluid ${one.words}`,
			words: one.words,
			printed: `${one.amount}; ${one.kind}`
		})),
		...sheet.fits.map((one) => ({
			key: `fit ${one.clearance}`,
			words: `Fit of ${one.clearance}`,
			printed: `${one.outer} less ${one.inner}${one.selective ? ', selectively fitted' : ''}`
		}))
	].filter((one) => one.printed !== '');
	const things = keyedThings(sheet).map(({ key }) => thingWords(sheet, key));
	return [...head, ...things];
}

function thingWords(sheet: DataSheet, key: string): Printed {
	const at = <T extends { key: string }>(list: readonly T[]) => list.find((one) => one.key === key);
	const dimension = at(sheet.dimensions);
	if (dimension) return { key, words: dimension.words, printed: dimensionPrinted(dimension) };
	const fastener = at(sheet.fasteners);
	if (fastener) return { key, words: fastener.words, printed: fastenerPrinted(fastener) };
	const pattern = at(sheet.patterns);
	if (pattern) return { key, words: pattern.words, printed: patternPrinted(pattern) };
	const oversize = at(sheet.oversizes);
	if (oversize)
		return {
			key,
			words: oversize.words,
			printed: `${oversize.kind} of ${oversize.of}: ${oversize.stepsMm.join(', ')} mm`
		};
	const shims = at(sheet.shims);
	if (shims)
		return {
			key,
			words: shims.words,
			printed: `${shims.fromMm} to ${shims.toMm} mm by ${shims.stepMm} mm`
		};
	const port = at(sheet.ports);
	if (port)
		return {
			key,
			words: port.words,
			printed: `${port.carries}: ${port.from} to ${port.to}${port.diameterMm ? `, ⌀ ${port.diameterMm} mm` : ''}${port.note ? `; ${port.note}` : ''}`
		};
	const weak = at(sheet.weakPoints);
	if (!weak) throw new Error(`${key} is in no list of the sheet`);
	return {
		key,
		words: weak.words,
		printed: `${weak.fails} Shows: ${weak.shows} Check: ${weak.check}`
	};
}

/** "40.000 mm; to build 39.980 to 39.996 mm; to run again from 39.950 mm; source …, p. 3" */
function dimensionPrinted(one: Dimension): string {
	const says = (value: number) => figureWords(value, one);
	const { nominal, build, runAgain } = one;
	return [
		one.words,
		nominal !== undefined && `nominal ${says(nominal)}`,
		build && `to build ${says(build.least)} to ${says(build.most)}`,
		runAgain?.least !== undefined && `to run again from ${says(runAgain.least)}`,
		runAgain?.most !== undefined && `to run again up to ${says(runAgain.most)}`,
		one.note,
		one.page ? `${one.source}, ${one.page}` : one.source
	]
		.filter(Boolean)
		.join('; ');
}

function fastenerPrinted(one: Fastener): string {
	return [
		`M${one.thread.diameterMm} × ${one.thread.pitchMm}`,
		one.propertyClass,
		stageWords(one.stages),
		one.lubrication,
		one.nutFactor && `K ${one.nutFactor.least} to ${one.nutFactor.most}`,
		one.gripMm && `grip ${one.gripMm} mm`,
		one.count && `${one.count} of them`,
		one.drive,
		one.reuse,
		one.yieldTightened && 'yield-tightened',
		one.page ? `${one.source}, ${one.page}` : one.source
	]
		.filter(Boolean)
		.join('; ');
}

function patternPrinted({ fastener, bolts, printedOrder }: Pattern): string {
	const places = bolts.map(({ id, xMm, yMm }) => `${id} ${xMm}, ${yMm}`).join('; ');
	return `${fastener} at ${places}; ${printedOrder ? `order ${printedOrder.join(' ')}` : 'no order printed'}`;
}

function layoutWords({ layout }: DataSheet): string {
	if (!layout) return '';
	const { cylinders, cycle, ignition, firingOrder } = layout;
	return `${cylinders} cylinders, ${cycle}, ${ignition} ignition, ${firingOrder.join('-')}`;
}
