import type { Formula } from '../formula';
import { firingFormulas } from './formulas/firing';
import { testFormulas } from './formulas/tests';
import { mechanismFormulas } from './formulas/mechanism';
import { volumeFormulas } from './formulas/volumes';

export const cylinderFormulas: readonly Formula[] = [
	...volumeFormulas,
	...mechanismFormulas,
	...firingFormulas,
	...testFormulas
];
