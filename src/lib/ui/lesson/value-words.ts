import type { Dimension, Fastener } from '$lib/domain/data-sheets/schema';
import { figureWords, stageWords } from '$lib/domain/data-sheets/unit-words';

type Cell = { label: string; value: string };

/** "0.020–0.048 mm" */
export function dimensionWords(dimension: Dimension): string {
	const { build, nominal, decimals } = dimension;
	return build
		? `${build.least.toFixed(decimals)}–${figureWords(build.most, dimension)}`
		: figureWords(nominal ?? 0, dimension);
}

export function dimensionCells(dimension: Dimension): Cell[] {
	const { build, nominal, runAgain } = dimension;
	const fixed = (value: number) => figureWords(value, dimension);
	const cells: Cell[] = [];
	if (nominal !== undefined) cells.push({ label: 'nominal', value: fixed(nominal) });
	if (build) cells.push({ label: 'to build', value: dimensionWords(dimension) });
	if (runAgain?.most !== undefined)
		cells.push({ label: 'to run again', value: `up to ${fixed(runAgain.most)}` });
	if (runAgain?.least !== undefined)
		cells.push({ label: 'to run again', value: `down to ${fixed(runAgain.least)}` });
	return cells;
}

export function fastenerCells(fastener: Fastener): Cell[] {
	const { thread, propertyClass, lubrication, reuse } = fastener;
	return [
		{ label: 'thread', value: `M${thread.diameterMm} × ${thread.pitchMm}, ${propertyClass}` },
		{ label: 'tighten', value: stageWords(fastener.stages) },
		{ label: 'lubrication', value: lubrication },
		{ label: 'fitted again', value: reuse }
	];
}
