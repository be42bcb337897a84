import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { SheetFigure, SheetTightening } from './sheet-figures';

export type FigurePart = 'nominal' | 'least' | 'most' | 'wearLimit';

const partNames: Record<FigurePart, string> = {
	nominal: 'nominal size',
	least: 'least size',
	most: 'greatest size',
	wearLimit: 'wear limit'
};

/** "12.5 mm"; a degree sign stands without a space, as it is printed. */
export function withUnit(value: number, decimals: number, unit: string): string {
	const printed = value.toFixed(decimals).replace(/^-/, '−');
	return unit === '°' ? `${printed}°` : unit ? `${printed} ${unit}` : printed;
}

export function figureWords(figure: SheetFigure): string {
	const { least, most, nominal, wearLimit, decimals, unit } = figure;
	if (least !== undefined && most !== undefined)
		return `${least.toFixed(decimals)} to ${withUnit(most, decimals, unit)}`;
	if (nominal !== undefined) return withUnit(nominal, decimals, unit);
	if (most !== undefined) return `at most ${withUnit(most, decimals, unit)}`;
	if (least !== undefined) return `at least ${withUnit(least, decimals, unit)}`;
	return wearLimit === undefined ? 'not stated' : withUnit(wearLimit, decimals, unit);
}

export function partOf(figure: SheetFigure, part: FigurePart): Outcome<number> {
	const value = figure[part];
	return value === undefined
		? cannot(`${figure.words} has no ${partNames[part]} in the data sheet`)
		: computed(value);
}

export function partName(part: FigurePart): string {
	return partNames[part];
}

export function partWords(figure: SheetFigure, part: FigurePart): Outcome<string> {
	const value = partOf(figure, part);
	return value.ok ? computed(withUnit(value.value, figure.decimals, figure.unit)) : value;
}

/** "30 N·m, then 90°, then 90°" */
export function tighteningWords(tightening: SheetTightening): string {
	return tightening.stages
		.map((stage) => (stage.kind === 'torque' ? `${stage.torqueNm} N·m` : `${stage.angleDeg}°`))
		.join(', then ');
}
