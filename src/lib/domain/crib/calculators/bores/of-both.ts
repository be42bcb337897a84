import { ofDifferenceMm } from '$lib/kernel/measurement/uncertainty';
import type { Step } from '../../../working';
import { figure } from '../formula-figures';

/** Uncertainty of an outer size less an inner one: both count. Nothing where one is not known. */
export function ofBoth(
	of: string,
	outerMm: number | undefined,
	innerMm: number | undefined
): { expandedMm: number | undefined; steps: Step[] } {
	if (outerMm === undefined || innerMm === undefined) return { expandedMm: undefined, steps: [] };
	const expandedMm = ofDifferenceMm(outerMm, innerMm);
	return {
		expandedMm,
		steps: [
			{
				words: `${of}: uncertainty from both readings`,
				rule: 'U = √(U1² + U2²)',
				formula: `√(${figure(outerMm, 4)}² + ${figure(innerMm, 4)}²)`,
				value: expandedMm,
				unit: 'mm',
				decimals: 4
			}
		]
	};
}
