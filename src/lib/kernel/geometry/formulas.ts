import type { Formula } from '../formula';
import { boreFormulas } from './formulas/bores';
import { clearanceFormulas } from './formulas/clearances';
import { faceFormulas } from './formulas/faces';
import { temperatureFormulas } from './formulas/temperature';
import { valveFormulas } from './formulas/valves';

export const geometryFormulas: readonly Formula[] = [
	...boreFormulas,
	...clearanceFormulas,
	...faceFormulas,
	...temperatureFormulas,
	...valveFormulas
];
