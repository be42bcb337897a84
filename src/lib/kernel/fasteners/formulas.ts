import type { Formula } from '../formula';
import { angleFormulas } from './formulas/angle';
import { leverFormulas } from './formulas/levers';
import { orderFormulas } from './formulas/orders';
import { preloadFormulas } from './formulas/preload';
import { stiffnessFormulas } from './formulas/stiffness';
import { threadFormulas } from './formulas/threads';

export const fastenerFormulas: readonly Formula[] = [
	...threadFormulas,
	...preloadFormulas,
	...stiffnessFormulas,
	...angleFormulas,
	...leverFormulas,
	...orderFormulas
];
