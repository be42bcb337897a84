import { fitOf } from '$lib/kernel/geometry/fit';
import type { DataSheet, Dimension } from '../schema';
import { figureWords } from '../unit-words';
import { dimensionOf } from '../value-of';
import { refused, warned, type Check, type Finding } from './finding';

/** A micrometre: what rounding to three places may leave between two printed limits. */
const roundingMm = 0.0011;

/**
 * What the limits of bore and journal can give against the clearance that is printed. Wider than
 * printed: some parts that both pass would not fit, unless they are chosen for each other.
 */
export const clearancesFollow: Check = (sheet) =>
	sheet.fits.flatMap(({ clearance, outer, inner, selective }) => {
		const [gap, bore, pin] = [clearance, outer, inner].map((key) => dimensionOf(sheet, key));
		if (!gap?.build || !bore?.build || !pin?.build) return [];
		const given = fitOf(
			{ leastMm: bore.build.least, mostMm: bore.build.most },
			{ leastMm: pin.build.least, mostMm: pin.build.most }
		);
		if (!given.ok) return [refused(clearance, `${outer} and ${inner}: ${given.because}`)];
		const { leastMm, mostMm } = given.value;
		const says = (value: number) => figureWords(value, gap);
		const both = `${bore.words} and ${pin.words} give ${says(leastMm)} to ${says(mostMm)}`;
		const printed = `${says(gap.build.least)} to ${says(gap.build.most)} is printed`;
		if (mostMm < gap.build.least || leastMm > gap.build.most)
			return [refused(clearance, `${both}, but ${printed}: no pair of parts can have it`)];
		const wider = leastMm < gap.build.least - roundingMm || mostMm > gap.build.most + roundingMm;
		if (wider && !selective)
			return [
				refused(
					clearance,
					`${both}, but ${printed}: mark it as selectively fitted, or mend a limit`
				)
			];
		const narrower = leastMm > gap.build.least + roundingMm || mostMm < gap.build.most - roundingMm;
		return narrower && !selective
			? [warned(clearance, `${both}, and ${printed}: part of what is printed can never be met`)]
			: [];
	});

/** Shells in their housing: housing less two walls is the bearing bore that is printed. */
export const shellsFillTheirHousing: Check = (sheet) =>
	sheet.partFamilies.flatMap(({ key }): Finding[] => {
		const of = (name: string): Dimension | undefined => dimensionOf(sheet, `${key}.${name}`);
		const [housing, wall, bore] = [of('housingBore'), of('shellWall'), of('bearingBore')];
		if (!housing?.build || !wall?.build || !bore?.build) return [];
		const least = housing.build.least - 2 * wall.build.most;
		const most = housing.build.most - 2 * wall.build.least;
		const says = (value: number) => figureWords(value, bore);
		const meets = least <= bore.build.most + roundingMm && most >= bore.build.least - roundingMm;
		if (!meets)
			return [
				refused(
					bore.key,
					`housing less two shells is ${says(least)} to ${says(most)}, and ${says(bore.build.least)} to ${says(bore.build.most)} is printed`
				)
			];
		return least < bore.build.least - roundingMm || most > bore.build.most + roundingMm
			? [
					warned(
						bore.key,
						`housing less two shells reaches from ${says(least)} to ${says(most)}: shells are chosen by their grade`
					)
				]
			: [];
	});

/** A pair of sizes of one part family that is called a clearance but named in no fit is not checked: say so. */
export const clearancesAreTied: Check = (sheet: DataSheet) =>
	sheet.dimensions
		.filter(({ key }) => /(oilClearance|stemClearance|^piston\.clearance)$/i.test(key))
		.filter(({ key }) => !sheet.fits.some((one) => one.clearance === key))
		.map(({ key }) =>
			warned(key, 'no fit says which two sizes it follows from, so it cannot be checked')
		);
