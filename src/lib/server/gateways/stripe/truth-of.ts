import type Stripe from 'stripe';
import type { CheckoutTruth } from '$lib/domain/billing/settle';

/** A word that this version of the SDK does not know opens no places: it counts as not yet paid. */
const payments = new Map<string, CheckoutTruth['payment']>([
	['paid', 'paid'],
	['no_payment_required', 'not-needed']
]);
const ends = new Map<string, CheckoutTruth['status']>([
	['complete', 'complete'],
	['expired', 'expired']
]);

export function truthOf(session: Stripe.Checkout.Session): CheckoutTruth {
	const intent = session.payment_intent;
	return {
		checkoutId: session.id,
		live: session.livemode,
		status: ends.get(session.status ?? 'open') ?? 'open',
		payment: payments.get(session.payment_status) ?? 'unpaid',
		paymentId: typeof intent === 'string' ? intent : (intent?.id ?? null),
		money: {
			amountMinor: session.amount_total ?? 0,
			currency: (session.currency ?? '').toUpperCase()
		},
		orderId: session.metadata?.orderId ?? session.client_reference_id ?? null,
		schoolId: session.metadata?.schoolId ?? null,
		fault:
			intent !== null && typeof intent === 'object'
				? (intent.last_payment_error?.message ?? null)
				: null
	};
}
