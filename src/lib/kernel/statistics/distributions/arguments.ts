/** @throws RangeError unless 0 < p < 1: a quantile at 0 or 1 would be no number. */
export function wantProbability(p: number): void {
	if (!(p > 0 && p < 1)) throw new RangeError('a probability lies between 0 and 1');
}

/** @throws RangeError unless each is a number above zero. */
export function wantPositive(...parameters: number[]): void {
	if (!parameters.every((one) => one > 0 && Number.isFinite(one)))
		throw new RangeError('a parameter of a distribution is a number above zero');
}

/** @throws RangeError where x is no number; far out it may be infinite. */
export function wantNumber(x: number): void {
	if (Number.isNaN(x)) throw new RangeError('a distribution is asked at a number');
}
