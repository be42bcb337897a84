import type { Formula } from '../formula';
import { instrumentFormulas } from './formulas/of-instruments';
import { rulingFormulas } from './formulas/of-ruling';
import { studyFormulas } from './formulas/of-study';
import { uncertaintyFormulas } from './formulas/of-uncertainty';

export const measurementFormulas: readonly Formula[] = [
	...uncertaintyFormulas,
	...rulingFormulas,
	...studyFormulas,
	...instrumentFormulas
];
