import type { Line } from './line';
import { gammaCdf, gammaQuantile, gammaUpperTail } from '../gamma';
import { chiSquaredCdf, chiSquaredQuantile, chiSquaredUpperTail } from '../chi-squared';
import { fCdf, fQuantile, fUpperTail } from '../f';
import { betaCdf, betaQuantile, betaUpperTail } from '../beta';
import { binomialCdf, binomialUpperTail } from '../binomial';

export const skewedLines: readonly Line[] = [
	[
		gammaCdf,
		'gamma-cdf',
		'P(a, x/s)',
		'6.5.1',
		'below 2, shape 1: 1 − e^−2',
		gammaCdf(2, 1),
		0.864665,
		1e-6
	],
	[
		gammaUpperTail,
		'gamma-upper-tail',
		'Q(a, x/s)',
		'6.5.3',
		'above 2, shape 1: e^−2',
		gammaUpperTail(2, 1),
		0.135335,
		1e-6
	],
	[
		gammaQuantile,
		'gamma-quantile',
		'x with P(a, x/s) = p',
		'6.5.1',
		'the middle of shape 1: ln 2',
		gammaQuantile(0.5, 1),
		0.693147,
		1e-6
	],
	[
		chiSquaredCdf,
		'chi-squared-cdf',
		'P(ν/2, x/2)',
		'26.4.19',
		'below 3.84, one degree of freedom',
		chiSquaredCdf(3.84, 1),
		0.949956,
		1e-6
	],
	[
		chiSquaredUpperTail,
		'chi-squared-upper-tail',
		'Q(ν/2, x/2)',
		'26.4.19',
		'above 3.84, one degree of freedom',
		chiSquaredUpperTail(3.84, 1),
		0.050044,
		1e-6
	],
	[
		chiSquaredQuantile,
		'chi-squared-quantile',
		'x with P(ν/2, x/2) = p',
		'26.4.19',
		'95 %, one degree of freedom',
		chiSquaredQuantile(0.95, 1),
		3.841459,
		1e-6
	],
	[
		fCdf,
		'f-cdf',
		'I_w(m/2, n/2), w = m x / (m x + n)',
		'26.6.2',
		'below 1.794678, 5 and 18',
		fCdf(1.794678, 5, 18),
		0.835231,
		1e-6
	],
	[
		fUpperTail,
		'f-upper-tail',
		'I_w(n/2, m/2), w = n / (n + m x)',
		'26.6.2',
		'above 1.794678, 5 and 18',
		fUpperTail(1.794678, 5, 18),
		0.164769,
		1e-6
	],
	[
		fQuantile,
		'f-quantile',
		'x with P(x) = p',
		'26.6.2',
		'95 %, 5 and 15',
		fQuantile(0.95, 5, 15),
		2.901295,
		1e-6
	],
	[
		betaCdf,
		'beta-cdf',
		'I_x(a, b)',
		'26.5.1',
		'below 0.3, 2 and 5',
		betaCdf(0.3, 2, 5),
		0.579825,
		1e-9
	],
	[
		betaUpperTail,
		'beta-upper-tail',
		'I_(1−x)(b, a)',
		'26.5.2',
		'above 0.3, 2 and 5',
		betaUpperTail(0.3, 2, 5),
		0.420175,
		1e-9
	],
	[
		betaQuantile,
		'beta-quantile',
		'x with I_x(a, b) = p',
		'26.5.1',
		'the middle of 2 and 3',
		betaQuantile(0.5, 2, 3),
		0.385728,
		1e-6
	],
	[
		binomialCdf,
		'binomial-cdf',
		'I_(1−p)(n − k, k + 1)',
		'26.5.24',
		'at most 6 of 10 at 0.8',
		binomialCdf(6, 10, 0.8),
		0.120874,
		1e-6
	],
	[
		binomialUpperTail,
		'binomial-upper-tail',
		'I_p(k + 1, n − k)',
		'26.5.24',
		'more than 6 of 10 at 0.8',
		binomialUpperTail(6, 10, 0.8),
		0.879126,
		1e-6
	]
];
