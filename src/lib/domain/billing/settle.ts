import { sameMoney, type Money } from '../money';

/** What the till says about a checkout when it is asked: the truth that an event only hints at. */
export type CheckoutTruth = {
	checkoutId: string;
	live: boolean;
	status: 'open' | 'complete' | 'expired';
	payment: 'paid' | 'unpaid' | 'not-needed';
	paymentId: string | null;
	money: Money;
	orderId: string | null;
	schoolId: string | null;
	fault: string | null;
};
export type Order = {
	id: string;
	schoolId: string;
	checkoutId: string | null;
	state: string;
	money: Money;
};
export type Settlement =
	| { to: 'paid'; paymentId: string | null }
	| { to: 'refused'; fault: string }
	| { to: 'expired' }
	| { to: 'unchanged'; because: string };

/**
 * What follows for an order from what the till says now. It does not matter which event asked,
 * how often, or in which order: a paid order stays paid, and nothing opens places unless
 * status, mode, amount, currency, order and school all agree.
 */
export function settle(order: Order, truth: CheckoutTruth, liveExpected: boolean): Settlement {
	const odd = mismatch(order, truth, liveExpected);
	if (odd) return { to: 'unchanged', because: odd };
	if (order.state === 'paid') return { to: 'unchanged', because: 'It was paid before.' };
	if (truth.status === 'complete' && truth.payment === 'paid')
		return { to: 'paid', paymentId: truth.paymentId };
	if (truth.status === 'expired') return { to: 'expired' };
	if (truth.fault) return { to: 'refused', fault: truth.fault };
	return { to: 'unchanged', because: 'It is not paid yet.' };
}

function mismatch(order: Order, truth: CheckoutTruth, liveExpected: boolean): string | undefined {
	if (truth.live !== liveExpected) return 'It is of another mode (live or test).';
	if (truth.orderId !== order.id) return 'It names another order.';
	if (truth.schoolId !== order.schoolId) return 'It names another school.';
	if (order.checkoutId !== null && truth.checkoutId !== order.checkoutId)
		return 'It is another checkout.';
	if (!sameMoney(order.money, truth.money)) return 'The amount or the currency differs.';
	return undefined;
}
