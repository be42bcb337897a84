import type { Formula } from '../../formula';
import { boreByDial } from '../instruments/bore-gauge';
import { threadTaper } from '../instruments/gauge-thread';
import { freedOfZeroError, inchMicrometerIn, metricMicrometerMm } from '../instruments/micrometer';
import { inchVernierIn, metricVernierMm, vernierValue } from '../instruments/vernier';

export const instrumentFormulas: readonly Formula[] = [
	{
		id: 'measurement/metric-micrometer',
		works: metricMicrometerMm,
		formula: 'frame + whole + 0.5 · half + 0.01 · thimble + 0.001 · vernier',
		source: 'US Army TM 9-243',
		example: {
			says: '18, one half, thimble 10',
			gives: () => metricMicrometerMm({ wholeMm: 18, halfLines: 1, thimbleLine: 10 }),
			wanted: 18.6,
			within: 1e-9
		}
	},
	{
		id: 'measurement/inch-micrometer',
		works: inchMicrometerIn,
		formula: 'frame + 0.1 · figure + 0.025 · lines + 0.001 · thimble + 0.0001 · vernier',
		source: 'US Navy NAVEDTRA 14001',
		example: {
			says: '4, two lines, thimble 18',
			gives: () => inchMicrometerIn({ barrelFigure: 4, lines: 2, thimbleLine: 18 }),
			wanted: 0.468,
			within: 1e-9
		}
	},
	{
		id: 'measurement/zero-error',
		works: freedOfZeroError,
		formula: 'size = reading − reading at zero',
		source: 'definition; US Army TM 9-243',
		example: {
			says: '22.36 with 0.02 when closed',
			gives: () => freedOfZeroError(22.36, 0.02),
			wanted: 22.34,
			within: 1e-9
		}
	},
	{
		id: 'measurement/vernier-value',
		works: vernierValue,
		formula: 'δ = s − (n − 1) s / n = s / n',
		source: 'US Army TM 9-243',
		example: {
			says: 'ten lines over a thousandth of an inch',
			gives: () => vernierValue(0.001, 10),
			wanted: 0.0001,
			within: 1e-9
		}
	},
	{
		id: 'measurement/metric-vernier',
		works: metricVernierMm,
		formula: 'main scale + vernier line · least count',
		source: 'US Army TM 9-243',
		example: {
			says: '37 and line 23 of 0.02 mm',
			gives: () => metricVernierMm(37, 23, 0.02),
			wanted: 37.46,
			within: 1e-9
		}
	},
	{
		id: 'measurement/inch-vernier',
		works: inchVernierIn,
		formula: 'inches + 0.1 · tenths + 0.025 · lines + 0.001 · vernier',
		source: 'US Army Ordnance course OD1642',
		example: {
			says: '1, 4, 3 and line 11',
			gives: () => inchVernierIn({ inches: 1, tenths: 4, lines: 3, vernierLine: 11 }),
			wanted: 1.486,
			within: 1e-9
		}
	},
	{
		id: 'measurement/bore-by-dial',
		works: boreByDial,
		formula: 'bore = setting + where the needle turns back',
		source: 'definition',
		example: {
			says: '86 mm and 0.035 more',
			gives: () => boreByDial(86, 0.035),
			wanted: 86.035,
			within: 1e-9
		}
	},
	{
		id: 'measurement/thread-taper',
		works: threadTaper,
		formula: '|c1 − c2|',
		source: 'definition; US Army TM 5-3895-383-24, p. 8-59',
		example: {
			says: '0.0025 and 0.0015 in',
			gives: () => threadTaper(0.0025, 0.0015),
			wanted: 0.001,
			within: 1e-9
		}
	}
];
