import type { Dimension, Fastener } from '$lib/domain/data-sheets/schema';

const units: Record<Dimension['unit'], string> = {
	mm: ' mm',
	cm3: ' cm³',
	bar: ' bar',
	degC: ' °C',
	ratio: ''
};
type Cell = { label: string; value: string };

/** "0.020–0.048 mm" */
export function dimensionWords(dimension: Dimension): string {
	const { build, nominal, decimals, unit } = dimension;
	if (build)
		return `${build.least.toFixed(decimals)}–${build.most.toFixed(decimals)}${units[unit]}`;
	return `${(nominal ?? 0).toFixed(decimals)}${units[unit]}`;
}

export function dimensionCells(dimension: Dimension): Cell[] {
	const { build, nominal, runAgain, decimals, unit } = dimension;
	const fixed = (value: number) => `${value.toFixed(decimals)}${units[unit]}`;
	const cells: Cell[] = [];
	if (nominal !== undefined) cells.push({ label: 'nominal', value: fixed(nominal) });
	if (build) cells.push({ label: 'to build', value: dimensionWords(dimension) });
	if (runAgain?.most !== undefined)
		cells.push({ label: 'to run again', value: `up to ${fixed(runAgain.most)}` });
	if (runAgain?.least !== undefined)
		cells.push({ label: 'to run again', value: `down to ${fixed(runAgain.least)}` });
	return cells;
}

/** "20 N·m, then 90°" */
export function stageWords({ stages }: Pick<Fastener, 'stages'>): string {
	return stages
		.map((stage) => ('torqueNm' in stage ? `${stage.torqueNm} N·m` : `${stage.angleDeg}°`))
		.join(', then ');
}

export function fastenerCells(fastener: Fastener): Cell[] {
	const { thread, propertyClass, lubrication, reuse } = fastener;
	return [
		{ label: 'thread', value: `M${thread.diameterMm} × ${thread.pitchMm}, ${propertyClass}` },
		{ label: 'tighten', value: stageWords(fastener) },
		{ label: 'lubrication', value: lubrication },
		{ label: 'fitted again', value: reuse }
	];
}
