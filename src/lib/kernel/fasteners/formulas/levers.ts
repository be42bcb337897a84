import type { Formula } from '../../formula';
import { forgottenExtension, withDrag } from '../drag';
import { effectiveLever, torqueAtFastener, wrenchSetting } from '../extension';
import { shareOfScale } from '../wrench-range';

const leverRule = 'US Army TM 1-1500-204-23-9, chapter 8, figure 8-16; FAA AC 43.13-1B, 7-40';
const lever = { lengthL: 400, extensionE: 100, angleDeg: 60 };

/** Wrenches with something between their square and the fastener. */
export const leverFormulas: readonly Formula[] = [
	{
		id: 'fasteners/effective-lever',
		works: effectiveLever,
		formula: 'Leff = L + E · cos φ',
		source: leverRule,
		example: {
			says: 'L 400 mm, E 100 mm, 60°',
			gives: () => effectiveLever(lever),
			wanted: 450,
			within: 0.01
		}
	},
	{
		id: 'fasteners/wrench-setting',
		works: wrenchSetting,
		formula: 'Tw = Ta · L / (L + E · cos φ)',
		source: leverRule,
		example: {
			says: '80 N·m wanted, L 400 mm, E 100 mm, 60°',
			gives: () => wrenchSetting({ torque: 80, ...lever }),
			wanted: 71.11,
			within: 0.005
		}
	},
	{
		id: 'fasteners/torque-at-fastener',
		works: torqueAtFastener,
		formula: 'Ta = Tw · (L + E · cos φ) / L',
		source: leverRule,
		example: {
			says: 'set to 50 N·m, L 400 mm, E 60 mm straight on',
			gives: () => torqueAtFastener({ torque: 50, lengthL: 400, extensionE: 60, angleDeg: 0 }),
			wanted: 57.5,
			within: 0.005
		}
	},
	{
		id: 'fasteners/with-drag',
		works: withDrag,
		formula: 'T = wanted + drag',
		source: 'FAA AC 43.13-1B, 7-40',
		example: {
			says: '50 wanted, 8 of drag',
			gives: () => withDrag(50, 8),
			wanted: 58,
			within: 1e-9
		}
	},
	{
		id: 'fasteners/forgotten-extension',
		works: forgottenExtension,
		formula: 'error = E · cos φ / L',
		source: leverRule,
		example: {
			says: 'L 400 mm, E 60 mm straight on',
			gives: () => forgottenExtension(400, 60, 0),
			wanted: 0.15,
			within: 1e-9
		}
	},
	{
		id: 'fasteners/share-of-scale',
		works: shareOfScale,
		formula: 'share = Tw / Tfull',
		source: 'US Army TM 1-1500-204-23-9, table 8-1: ±4 % of the reading from 20 % of full scale on',
		example: {
			says: '40 N·m on a wrench of 200 N·m',
			gives: () => shareOfScale(40, 200),
			wanted: 0.2,
			within: 1e-9
		}
	}
];
