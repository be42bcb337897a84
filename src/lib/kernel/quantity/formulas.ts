import type { Formula } from '../formula';
import { convert } from './units';

export const quantityFormulas: readonly Formula[] = [
	{
		id: 'quantity/convert',
		works: convert,
		formula: 'x · f(from) / f(to)',
		source: 'NIST SP 811 (2008), B.8 and B.9; inch, pound and standard gravity exact by definition',
		example: {
			says: '18 lbf·ft in N·m',
			gives: () => convert('torque', 18, 'lbf·ft', 'N·m'),
			wanted: 24.405,
			within: 0.0005
		}
	}
];
