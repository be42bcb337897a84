import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { text } from 'node:stream/consumers';
import Stripe from 'stripe';

/** A checkout as the till shows it when it is asked; a test changes it as a payer would. */
export type TillSession = {
	id: string;
	object: 'checkout.session';
	livemode: boolean;
	url: string;
	status: 'open' | 'complete' | 'expired';
	payment_status: 'unpaid' | 'paid';
	amount_total: number;
	currency: string;
	client_reference_id: string | null;
	metadata: Record<string, string>;
	payment_intent: { id: string; last_payment_error: { message: string } | null } | null;
};

export type TestTill = {
	/** What a house needs in order to reach it. */
	environment: Record<string, string>;
	sessions: TillSession[];
	/** The idempotency keys that checkouts were asked for under. */
	keys: string[];
	/** While on, nothing but refusals is answered. */
	refuse: (on: boolean) => void;
	/** An event with the till's signature, as it comes to the webhook. */
	event: (session: TillSession, id: string, kind?: string) => SignedEvent;
	close: () => Promise<void>;
};
export type SignedEvent = { rawBody: string; signature: string };

const webhookSecret = 'whsec_of_this_test';
const { webhooks } = new Stripe('sk_test_of_this_test');

/** A till on a port of its own: it keeps checkouts and tells the truth about them, nothing more. */
export async function openTill(): Promise<TestTill> {
	const sessions: TillSession[] = [];
	const keys: string[] = [];
	let refuses = false;

	function create(form: URLSearchParams, key: string): TillSession {
		const before = sessions.find((one) => one.client_reference_id === key);
		if (before) return before;
		const item = 'line_items[0]';
		const id = `cs_test_${sessions.length + 1}`;
		const made: TillSession = {
			id,
			object: 'checkout.session',
			livemode: false,
			url: `http://till.example/${id}`,
			status: 'open',
			payment_status: 'unpaid',
			amount_total:
				Number(form.get(`${item}[quantity]`)) *
				Number(form.get(`${item}[price_data][unit_amount]`)),
			currency: form.get(`${item}[price_data][currency]`) ?? '',
			client_reference_id: form.get('client_reference_id'),
			metadata: {
				orderId: form.get('metadata[orderId]') ?? '',
				schoolId: form.get('metadata[schoolId]') ?? ''
			},
			payment_intent: null
		};
		sessions.push(made);
		return made;
	}

	const server = createServer((request, response) => {
		void (async () => {
			const form = new URLSearchParams(await text(request));
			const key = String(request.headers['idempotency-key'] ?? '');
			if (request.method === 'POST') keys.push(key);
			const id = (request.url ?? '').split('?')[0]?.split('/').at(-1);
			const found =
				request.method === 'POST' && !refuses
					? create(form, key)
					: sessions.find((one) => one.id === id);
			response.writeHead(found ? 200 : 400, { 'content-type': 'application/json' });
			response.end(
				JSON.stringify(found ?? { error: { type: 'invalid_request_error', message: 'no' } })
			);
		})();
	});
	await new Promise<void>((up) => server.listen(0, '127.0.0.1', up));
	const { port } = server.address() as AddressInfo;
	return {
		environment: {
			STRIPE_SECRET_KEY: 'sk_test_of_this_test',
			STRIPE_WEBHOOK_SECRET: webhookSecret,
			STRIPE_API_BASE: `http://127.0.0.1:${port}`
		},
		sessions,
		keys,
		refuse: (on) => void (refuses = on),
		event(session, id, kind = 'checkout.session.completed') {
			const data = { object: session };
			const rawBody = JSON.stringify({ id, object: 'event', type: kind, livemode: false, data });
			const timestamp = Math.floor(Date.now() / 1000);
			const signed = { payload: rawBody, secret: webhookSecret, timestamp };
			return { rawBody, signature: webhooks.generateTestHeaderString(signed) };
		},
		close: () =>
			new Promise((down) => {
				server.close(() => down());
				server.closeAllConnections();
			})
	};
}
