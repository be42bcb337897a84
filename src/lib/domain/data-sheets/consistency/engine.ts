import { displacementCm3 } from '$lib/kernel/cylinder/displacement';
import { ratioOf } from '$lib/kernel/cylinder/compression-ratio';
import { orderFault } from '$lib/kernel/cylinder/firing';
import type { DataSheet } from '../schema';
import { dimensionOf } from '../value-of';
import { refused, warned, type Check, type Finding } from './finding';

/** What a title may round away: 2.2 L says 2150 to 2250 cm³, and 1150 cm³ itself within half a per cent. */
const namedWithin = { litres: 50, cm3: 0.005 };

/** Bore and stroke against the displacement that the sheet's name states. */
export const nameSaysItsVolume: Check = (sheet) => {
	const { title, layout } = sheet;
	const bore = dimensionOf(sheet, 'cylinder.bore')?.nominal;
	const stroke = dimensionOf(sheet, 'crankshaft.stroke')?.nominal;
	if (!layout || !bore || !stroke || bore <= 0 || stroke <= 0) return [];
	const sweeps = displacementCm3(bore, stroke, layout.cylinders);
	const litres = /(\d+(?:\.\d+)?)\s*L\b/.exec(title)?.[1];
	const cm3 = /(\d{3,5})\s*cm³/.exec(title)?.[1];
	const named = litres ? Number(litres) * 1000 : cm3 ? Number(cm3) : undefined;
	if (named === undefined) return [];
	const room = litres ? namedWithin.litres : named * namedWithin.cm3;
	return Math.abs(sweeps - named) > room
		? [
				warned(
					'title',
					`bore and stroke sweep ${sweeps.toFixed(0)} cm³, and the title says ${named.toFixed(0)}`
				)
			]
		: [];
};

/** A printed compression ratio against the chamber volume above the piston, where both are given. */
export const ratioFollows: Check = (sheet) => {
	const bore = dimensionOf(sheet, 'cylinder.bore')?.nominal;
	const stroke = dimensionOf(sheet, 'crankshaft.stroke')?.nominal;
	const ratio = dimensionOf(sheet, 'cylinder.compressionRatio')?.nominal;
	const clearance = dimensionOf(sheet, 'cylinder.clearanceVolume')?.nominal;
	if (!bore || !stroke || !ratio || !clearance || bore <= 0 || stroke <= 0) return [];
	const computedRatio = ratioOf(displacementCm3(bore, stroke), clearance);
	if (!computedRatio.ok) return [refused('cylinder.clearanceVolume', computedRatio.because)];
	return Math.abs(computedRatio.value - ratio) > ratio * 0.01
		? [
				refused(
					'cylinder.compressionRatio',
					`swept and clearance volume give ${computedRatio.value.toFixed(2)} : 1, and ${ratio} : 1 is printed`
				)
			]
		: [];
};

export const firingOrderIsWhole: Check = ({ layout }) => {
	if (!layout) return [];
	const fault = orderFault(layout.cylinders, layout.firingOrder);
	return fault ? [refused('layout', `firing order ${layout.firingOrder.join('-')}: ${fault}`)] : [];
};

/** Oversizes rise, and none is so small that it lies inside the wear that is still allowed. */
export const oversizesRise: Check = (sheet) =>
	sheet.oversizes.flatMap(({ key, of, kind, stepsMm }): Finding[] => {
		const sorted = stepsMm.every((one, at) => at === 0 || one > (stepsMm[at - 1] ?? 0));
		if (!sorted) return [refused(key, `its sizes do not rise: ${stepsMm.join(', ')} mm`)];
		const part = dimensionOf(sheet, of);
		const limit = kind === 'oversize' ? part?.runAgain?.most : part?.runAgain?.least;
		const from = kind === 'oversize' ? part?.build?.most : part?.build?.least;
		const [first] = stepsMm;
		if (limit === undefined || from === undefined || first === undefined) return [];
		const wear = Math.abs(limit - from);
		return first < wear
			? [
					warned(
						key,
						`its first size, ${first} mm, would not clean up a part worn to its limit by ${wear.toFixed(3)} mm`
					)
				]
			: [];
	});

/** The ways of each fluid, from place to place: each begins where another one ends. */
export const waysAreConnected: Check = (sheet: DataSheet) =>
	(['oil', 'coolant', 'fuel', 'air'] as const).flatMap((fluid) => {
		const ways = sheet.ports.filter((one) => one.carries === fluid);
		const [first] = ways;
		if (!first) return [];
		const name = (words: string) => words.trim().toLowerCase();
		const reached = new Set([name(first.from), ...ways.map((one) => name(one.to))]);
		return ways
			.filter((one) => !reached.has(name(one.from)))
			.map((one) =>
				warned(one.key, `begins at “${one.from}”, where no way of the ${fluid} arrives`)
			);
	});

export const shimsHaveSteps: Check = ({ shims }) =>
	shims.flatMap(({ key, fromMm, toMm, stepMm }) => {
		const count = (toMm - fromMm) / stepMm;
		return Math.abs(count - Math.round(count)) > 1e-6
			? [warned(key, `from ${fromMm} to ${toMm} mm is no whole number of steps of ${stepMm} mm`)]
			: [];
	});
