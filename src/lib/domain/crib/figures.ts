import { convert, type DimensionName } from '$lib/kernel/quantity/units';
import type { System } from './field';
import type { FigureLine } from './worked';

type Other = { dimension: DimensionName; unit: string; moreDecimals: number };

/** The inch system's unit beside each metric one, and how many places more it needs to say as much. */
const others: Record<string, Other> = {
	mm: { dimension: 'length', unit: 'in', moreDecimals: 1 },
	µm: { dimension: 'length', unit: 'thou', moreDecimals: 1 },
	'N·m': { dimension: 'torque', unit: 'lbf·ft', moreDecimals: 0 },
	N: { dimension: 'force', unit: 'lbf', moreDecimals: 0 },
	kN: { dimension: 'force', unit: 'lbf', moreDecimals: -2 },
	bar: { dimension: 'pressure', unit: 'psi', moreDecimals: -1 },
	MPa: { dimension: 'pressure', unit: 'psi', moreDecimals: -2 },
	'cm³': { dimension: 'volume', unit: 'in³', moreDecimals: 1 },
	'°C': { dimension: 'temperature', unit: '°F', moreDecimals: 0 },
	kW: { dimension: 'power', unit: 'hp', moreDecimals: 0 },
	'm/s': { dimension: 'speed', unit: 'ft/min', moreDecimals: -2 }
};

export type Figure = { figure: string; unit: string };

/** A result as it is printed in one system; what has no unit of the other system stays as it is. */
export function figureIn(
	line: Pick<FigureLine, 'value' | 'unit' | 'decimals'>,
	system: System
): Figure {
	const other = system === 'inch' ? others[line.unit] : undefined;
	if (!other) return { figure: printed(line.value, line.decimals), unit: line.unit };
	const value = convert(other.dimension, line.value, line.unit as never, other.unit as never);
	return {
		figure: printed(value, Math.max(0, line.decimals + other.moreDecimals)),
		unit: other.unit
	};
}

export function hasOther(unit: string): boolean {
	return unit in others;
}

function printed(value: number, decimals: number): string {
	const text = value.toFixed(decimals).replace(/^-/, '−');
	return /^−0(\.0*)?$/.test(text) ? text.slice(1) : text;
}
