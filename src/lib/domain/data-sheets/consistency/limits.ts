import { figureWords } from '../unit-words';
import { refused, warned, type Check } from './finding';

/** Limits of one dimension among themselves. */
export const limitsAgree: Check = ({ dimensions }) =>
	dimensions.flatMap((one) => {
		const { key, build, runAgain, nominal } = one;
		const says = (value: number) => figureWords(value, one);
		const found = [];
		if (build && build.most < build.least)
			found.push(
				refused(
					key,
					`the least limit, ${says(build.least)}, lies above the most, ${says(build.most)}`
				)
			);
		const { least, most } = runAgain ?? {};
		if (least !== undefined && most !== undefined && most < least)
			found.push(
				refused(key, `to run again, the least, ${says(least)}, lies above the most, ${says(most)}`)
			);
		if (build && most !== undefined && most < build.most)
			found.push(
				refused(
					key,
					`a new part of ${says(build.most)} would already be past its wear limit of ${says(most)}`
				)
			);
		if (build && least !== undefined && least > build.least)
			found.push(
				refused(
					key,
					`a new part of ${says(build.least)} would already be past its wear limit of ${says(least)}`
				)
			);
		// Printed to this many places, two limits that differ by less are one.
		const step = 10 ** -one.decimals;
		if (build && build.most > build.least && build.most - build.least < step * 0.99)
			found.push(warned(key, `its limits differ by less than its last printed place`));
		if (build && nominal !== undefined && (nominal > build.most || nominal < build.least)) {
			const off = nominal > build.most ? nominal - build.most : build.least - nominal;
			const share = off / Math.max(Math.abs(nominal), 1e-9);
			// A shaft is made a little under its nominal size, a bore a little over.
			if (share > 0.002)
				found.push(
					warned(key, `its nominal ${says(nominal)} lies ${says(off)} outside its build limits`)
				);
		}
		return found;
	});

/** Each value says where it is printed: a page too, unless the sheet's values are invented. */
export const sourcesAreNamed: Check = ({ dimensions, fasteners }) =>
	[...dimensions, ...fasteners]
		.filter(({ source, page }) => !page && !/invented|measured/i.test(source))
		.map(({ key, source }) => warned(key, `names “${source}” but no page in it`));
