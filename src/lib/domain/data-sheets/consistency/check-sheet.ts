import type { DataSheet } from '../schema';
import {
	firingOrderIsWhole,
	nameSaysItsVolume,
	oversizesRise,
	ratioFollows,
	shimsHaveSteps,
	waysAreConnected
} from './engine';
import { patternsAreWhole, stagesSuitTheBolt } from './fasteners';
import type { Check, Finding } from './finding';
import { clearancesAreTied, clearancesFollow, shellsFillTheirHousing } from './fits';
import { limitsAgree, sourcesAreNamed } from './limits';

export type { Finding };

const checks: readonly Check[] = [
	limitsAgree,
	clearancesFollow,
	shellsFillTheirHousing,
	stagesSuitTheBolt,
	patternsAreWhole,
	firingOrderIsWhole,
	ratioFollows,
	oversizesRise,
	shimsHaveSteps,
	nameSaysItsVolume,
	waysAreConnected,
	clearancesAreTied,
	sourcesAreNamed
];

/**
 * Whether a data sheet agrees with itself: not whether its form is right, but whether its values
 * can be true together. What is refused comes first.
 */
export function checkSheet(sheet: DataSheet): Finding[] {
	const found = checks.flatMap((check) => check(sheet));
	return [
		...found.filter((one) => one.severity === 'refused'),
		...found.filter((one) => one.severity === 'warned')
	];
}
