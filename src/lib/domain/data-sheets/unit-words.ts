import type { Dimension } from './schema';

/** How a dimension's unit is printed; '' for a bare ratio or count. */
export const unitWords: Record<Dimension['unit'], string> = {
	mm: 'mm',
	cm3: 'cm³',
	bar: 'bar',
	kPa: 'kPa',
	degC: '°C',
	deg: '°',
	ratio: '',
	count: '',
	N: 'N',
	rpm: 'r/min'
};

/** "0.020 mm", "90°", "3". */
export function figureWords(
	value: number,
	{ unit, decimals }: Pick<Dimension, 'unit' | 'decimals'>
) {
	const printed = value.toFixed(decimals).replace(/^-/, '−');
	const mark = unitWords[unit];
	return mark === '°' ? `${printed}°` : mark ? `${printed} ${mark}` : printed;
}

/** "20 N·m, then 90°" */
export function stageWords(
	stages: readonly ({ torqueNm: number } | { angleDeg: number })[]
): string {
	return stages
		.map((stage) => ('torqueNm' in stage ? `${stage.torqueNm} N·m` : `${stage.angleDeg}°`))
		.join(', then ');
}
