import type { Line } from './line';
import { normalCdf, normalDensity, normalQuantile, normalUpperTail } from '../normal';
import { tCdf, tQuantile, tUpperTail } from '../student-t';
import { digamma, lnBeta, lnGamma } from '../special';

export const bellLines: readonly Line[] = [
	[
		lnGamma,
		'ln-gamma',
		'ln Γ(x)',
		'6.1.1',
		'ln Γ(10), which is ln 362 880',
		lnGamma(10),
		12.801827,
		1e-6
	],
	[
		lnBeta,
		'ln-beta',
		'ln Γ(a) + ln Γ(b) − ln Γ(a + b)',
		'6.2.2',
		'ln B(2, 3), which is ln 1/12',
		lnBeta(2, 3),
		-2.484907,
		1e-6
	],
	[
		digamma,
		'digamma',
		'ψ(x) = d ln Γ(x) / dx',
		'6.3.1 and 6.3.2',
		'ψ(1), less Euler’s constant',
		digamma(1),
		-0.577216,
		1e-6
	],
	[
		normalDensity,
		'normal-density',
		'e^(−z²/2) / √(2π)',
		'26.2.1',
		'in the middle',
		normalDensity(0),
		0.398942,
		1e-6
	],
	[
		normalCdf,
		'normal-cdf',
		'Φ(z) = ½ erfc(−z / √2)',
		'26.2.2 and 7.1.22',
		'below 1.96',
		normalCdf(1.96),
		0.975002,
		1e-6
	],
	[
		normalUpperTail,
		'normal-upper-tail',
		'Φ(−z)',
		'26.2.3',
		'above 3',
		normalUpperTail(3),
		0.0013499,
		1e-8
	],
	[
		normalQuantile,
		'normal-quantile',
		'z with Φ(z) = p',
		'26.2.22',
		'97.5 %',
		normalQuantile(0.975),
		1.959964,
		1e-6
	],
	[
		tCdf,
		't-cdf',
		'½ I_w(ν/2, ½), w = ν / (ν + x²), for x < 0',
		'26.7.1',
		'below 1, one degree of freedom',
		tCdf(1, 1),
		0.75,
		1e-9
	],
	[
		tUpperTail,
		't-upper-tail',
		'P(−x)',
		'26.7.1',
		'above 1, one degree of freedom',
		tUpperTail(1, 1),
		0.25,
		1e-9
	],
	[
		tQuantile,
		't-quantile',
		't with P(t) = p',
		'26.7.1',
		'97.5 %, ten degrees of freedom',
		tQuantile(0.975, 10),
		2.228139,
		1e-6
	]
];
