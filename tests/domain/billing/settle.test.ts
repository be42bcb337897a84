import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { settle, type CheckoutTruth, type Order } from '$lib/domain/billing/settle';

const money = { amountMinor: 84_000, currency: 'EUR' };
const order: Order = { id: 'o1', schoolId: 's1', checkoutId: 'c1', state: 'open', money };
const paid: CheckoutTruth = {
	checkoutId: 'c1',
	live: false,
	status: 'complete',
	payment: 'paid',
	paymentId: 'p1',
	money,
	orderId: 'o1',
	schoolId: 's1',
	fault: null
};

describe('an order follows what the till says now', () => {
	it('is paid when everything agrees', () => {
		expect(settle(order, paid, false)).toEqual({ to: 'paid', paymentId: 'p1' });
	});
	it.each<[string, Partial<CheckoutTruth>]>([
		['the mode', { live: true }],
		['the order', { orderId: 'o2' }],
		['the school', { schoolId: 's2' }],
		['the checkout', { checkoutId: 'c2' }],
		['the amount', { money: { ...money, amountMinor: 1 } }],
		['the currency', { money: { ...money, currency: 'NOK' } }],
		['the payment', { payment: 'unpaid' }],
		['the status', { status: 'open' }]
	])('opens nothing when %s does not fit', (_, odd) => {
		expect(settle(order, { ...paid, ...odd }, false).to).not.toBe('paid');
	});
	it('counts once, whatever is asked how often and in which order', () => {
		const truth = fc.constantFrom<Partial<CheckoutTruth>>(
			{},
			{ status: 'open', payment: 'unpaid' },
			{ status: 'expired', payment: 'unpaid' },
			{ status: 'open', payment: 'unpaid', fault: 'The card was refused.' }
		);
		fc.assert(
			fc.property(fc.array(truth, { maxLength: 12 }), (asked) => {
				let state = 'open';
				let opened = 0;
				for (const one of asked) {
					const next = settle({ ...order, state }, { ...paid, ...one }, false);
					if (next.to === 'paid') opened += 1;
					if (next.to === 'paid' || (next.to === 'expired' && state !== 'paid')) state = next.to;
				}
				expect(opened).toBe(asked.some((one) => Object.keys(one).length === 0) ? 1 : 0);
			})
		);
	});
});
