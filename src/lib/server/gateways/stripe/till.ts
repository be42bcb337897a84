import Stripe from 'stripe';
import { Problem } from '$lib/domain/problem';
import type { CheckoutTruth } from '$lib/domain/billing/settle';
import { problemOf } from './problem-of';
import { truthOf } from './truth-of';

export type CheckoutWanted = {
	orderId: string;
	schoolId: string;
	quantity: number;
	unitAmountMinor: number;
	/** ISO 4217, capitals. */
	currency: string;
	description: string;
	successUrl: string;
	cancelUrl: string;
	/** The intent's id: asked twice, the till makes one checkout. */
	idempotencyKey: string;
	/** The till takes 30 minutes to 24 hours from now, and says 24 hours where this is left out. */
	expiresAt?: Date;
	customerEmail?: string;
};

export type RefundWanted = {
	paymentId: string;
	orderId: string;
	/** All of it where this is left out. */
	amountMinor?: number;
	idempotencyKey: string;
};

/** What an event says. It is a hint to go and ask: nothing is decided from it. */
export type PaymentEvent = {
	id: string;
	kind: string;
	live: boolean;
	checkoutId: string | null;
	orderId: string | null;
};

export type Till = {
	/** Whether real money moves. */
	live: boolean;
	createCheckout: (wanted: CheckoutWanted) => Promise<{ checkoutId: string; url: string }>;
	readCheckout: (checkoutId: string) => Promise<CheckoutTruth>;
	refund: (
		wanted: RefundWanted
	) => Promise<{ refundId: string; state: 'done' | 'under-way' | 'failed' }>;
	/** @throws Problem 'refused' where the signature is not the till's, or too old */
	verifyWebhook: (rawBody: string, signatureHeader: string | null) => PaymentEvent;
};

export type TillOptions = { secretKey: string; webhookSecret: string; apiBase?: string };

export function makeTill({ secretKey, webhookSecret, apiBase }: TillOptions): Till {
	const stripe = new Stripe(secretKey, {
		...addressOf(apiBase),
		telemetry: false,
		maxNetworkRetries: 2,
		timeout: 20_000
	});
	return {
		live: /^(sk|rk)_live_/.test(secretKey),
		async createCheckout(wanted) {
			const { idempotencyKey } = wanted;
			const session = await stripe.checkout.sessions
				.create(sessionOf(wanted), { idempotencyKey })
				.catch(problemOf);
			if (!session.url) throw new Problem('refused', 'The till gave no address to pay at.');
			return { checkoutId: session.id, url: session.url };
		},
		async readCheckout(checkoutId) {
			const session = await stripe.checkout.sessions
				.retrieve(checkoutId, { expand: ['payment_intent'] })
				.catch(problemOf);
			return truthOf(session);
		},
		async refund({ paymentId, orderId, amountMinor, idempotencyKey }) {
			const made = await stripe.refunds
				.create(
					{
						payment_intent: paymentId,
						metadata: { orderId },
						...(amountMinor === undefined ? {} : { amount: amountMinor })
					},
					{ idempotencyKey }
				)
				.catch(problemOf);
			const state = made.status === 'succeeded' ? 'done' : 'under-way';
			const failed = made.status === 'failed' || made.status === 'canceled';
			return { refundId: made.id, state: failed ? 'failed' : state };
		},
		verifyWebhook(rawBody, signatureHeader) {
			try {
				const event = stripe.webhooks.constructEvent(rawBody, signatureHeader ?? '', webhookSecret);
				return hintOf(event);
			} catch (error) {
				const problem = new Problem(
					'refused',
					'This event does not carry the signature of the till.'
				);
				problem.cause = error;
				throw problem;
			}
		}
	};
}

function sessionOf(wanted: CheckoutWanted): Stripe.Checkout.SessionCreateParams {
	const metadata = { orderId: wanted.orderId, schoolId: wanted.schoolId };
	return {
		mode: 'payment',
		client_reference_id: wanted.orderId,
		metadata,
		payment_intent_data: { metadata },
		line_items: [
			{
				quantity: wanted.quantity,
				price_data: {
					currency: wanted.currency.toLowerCase(),
					unit_amount: wanted.unitAmountMinor,
					product_data: { name: wanted.description }
				}
			}
		],
		success_url: wanted.successUrl,
		cancel_url: wanted.cancelUrl,
		...(wanted.customerEmail ? { customer_email: wanted.customerEmail } : {}),
		...(wanted.expiresAt ? { expires_at: Math.floor(wanted.expiresAt.getTime() / 1000) } : {})
	};
}

function hintOf(event: Stripe.Event): PaymentEvent {
	const subject = event.data.object as {
		object?: string;
		id?: string;
		metadata?: Record<string, string> | null;
	};
	return {
		id: event.id,
		kind: event.type,
		live: event.livemode,
		checkoutId: subject.object === 'checkout.session' ? (subject.id ?? null) : null,
		orderId: subject.metadata?.orderId ?? null
	};
}

function addressOf(apiBase: string | undefined) {
	if (!apiBase) return {};
	const { hostname, port, protocol } = new URL(apiBase);
	const plain = protocol === 'http:';
	return {
		host: hostname.replace(/^\[|\]$/g, ''),
		port: port || (plain ? '80' : '443'),
		protocol: plain ? ('http' as const) : ('https' as const)
	};
}
