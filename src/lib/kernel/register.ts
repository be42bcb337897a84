import { captionFormulas } from './captions/formulas';
import { cylinderFormulas } from './cylinder/formulas';
import { fastenerFormulas } from './fasteners/formulas';
import type { Formula } from './formula';
import { geometryFormulas } from './geometry/formulas';
import { measurementFormulas } from './measurement/formulas';
import { quantityFormulas } from './quantity/formulas';
import { distributionFormulas } from './statistics/distributions/formulas';

/**
 * Every formula of the kernel with its source and a worked example. A test runs each example and
 * finds any function whose docstring states a formula that is not here.
 */
export const register: readonly Formula[] = [
	...quantityFormulas,
	...fastenerFormulas,
	...geometryFormulas,
	...measurementFormulas,
	...cylinderFormulas,
	...captionFormulas,
	...distributionFormulas
];
