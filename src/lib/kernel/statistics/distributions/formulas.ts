import type { Formula } from '../../formula';
import { bellLines } from './formulas/bell';
import { formulaOf } from './formulas/line';
import { skewedLines } from './formulas/skewed';

export const distributionFormulas: readonly Formula[] = [...bellLines, ...skewedLines].map(
	formulaOf
);
