/** An amount in a currency's smallest unit, so that sums stay whole. */
export type Money = { amountMinor: number; currency: string };

/** @throws RangeError when an amount is no whole number: money is never rounded silently. */
export function money(amountMinor: number, currency: string): Money {
	if (!Number.isSafeInteger(amountMinor)) throw new RangeError('amountMinor must be whole');
	if (!/^[A-Z]{3}$/.test(currency)) throw new RangeError('currency is an ISO 4217 code');
	return { amountMinor, currency };
}

export function sameMoney(a: Money, b: Money): boolean {
	return a.amountMinor === b.amountMinor && a.currency === b.currency;
}

/** For people: "EUR 1,240.00", by the school's locale and the currency's own number of decimals. */
export function moneyWords(value: Money, locale: string): string {
	const format = new Intl.NumberFormat(locale, { style: 'currency', currency: value.currency });
	const digits = format.resolvedOptions().maximumFractionDigits ?? 2;
	return format.format(value.amountMinor / 10 ** digits);
}
