import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';
import { isComponent, type Component, type Correlation } from './component';

/**
 * Combined standard uncertainty of a result from its inputs' ones.
 *
 * Formula: u² = Σ cᵢ² uᵢ² + 2 Σ cᵢ cⱼ uᵢ uⱼ r(i, j), the second sum over correlated pairs.
 * @param components inputs with their sensitivities @param correlations pairs that move together
 * @returns in the result's unit; "cannot" where a figure is none, or the correlations contradict
 * each other
 * Source: JCGM 100:2008 (GUM), 5.1.2 and 5.2.2.
 * @example combinedStandard([{ name: 'bore', type: 'B', standard: 0.003, sensitivity: 1,
 *   degreesOfFreedom: Infinity }, { name: 'pin', type: 'B', standard: 0.004, sensitivity: -1,
 *   degreesOfFreedom: Infinity }]) // 0.005
 */
export function combinedStandard(
	components: readonly Component[],
	correlations: readonly Correlation[] = []
): Outcome<number> {
	if (components.length === 0) return cannot('there is nothing to combine');
	if (!components.every(isComponent))
		return cannot('an uncertainty is a number, zero or more, and so are its degrees of freedom');
	const parts = components.map(({ sensitivity, standard }) => sensitivity * standard);
	let shared = 0;
	for (const { first, second, coefficient } of correlations) {
		const [a, b] = [parts[first], parts[second]];
		if (a === undefined || b === undefined || first === second)
			throw new RangeError('a correlation joins two components of the list');
		if (!(Math.abs(coefficient) <= 1)) return cannot('a correlation lies between −1 and 1');
		shared += 2 * a * b * coefficient;
	}
	const alone = Math.hypot(...parts);
	const squared = alone * alone + shared;
	if (squared < -1e-12 * alone * alone) return cannot('these correlations cannot all hold at once');
	return computedNumber(shared === 0 ? alone : Math.sqrt(Math.max(0, squared)));
}
