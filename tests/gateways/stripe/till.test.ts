import { createServer, type IncomingMessage, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { text } from 'node:stream/consumers';
import Stripe from 'stripe';
import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest';
import { makeTill, type Till } from '$lib/server/gateways/stripe';

const webhookSecret = 'whsec_for_this_test';
type Asked = { path: string; key: string | undefined; form: URLSearchParams };
type Reply = { status: number; body: unknown };

let server: Server;
let till: Till;
let asked: Asked[] = [];
let replies: Reply[] = [];

const session = {
	id: 'cs_test_1',
	object: 'checkout.session',
	livemode: false,
	url: 'http://127.0.0.1/pay/cs_test_1',
	status: 'open',
	payment_status: 'unpaid',
	amount_total: 36_000,
	currency: 'eur',
	client_reference_id: 'order1',
	metadata: { orderId: 'order1', schoolId: 'school1' },
	payment_intent: null
};

async function hear(request: IncomingMessage): Promise<Reply> {
	const key = request.headers['idempotency-key'];
	asked.push({
		path: `${request.method} ${request.url}`,
		key: typeof key === 'string' ? key : undefined,
		form: new URLSearchParams(await text(request))
	});
	return replies.shift() ?? { status: 200, body: session };
}

beforeAll(async () => {
	server = createServer((request, response) => {
		void hear(request).then(({ status, body }) => {
			if (status === 0) return request.socket.destroy();
			response.writeHead(status, { 'content-type': 'application/json' });
			response.end(JSON.stringify(body));
		});
	});
	await new Promise<void>((up) => server.listen(0, '127.0.0.1', up));
	const { port } = server.address() as AddressInfo;
	till = makeTill({ secretKey: 'sk_test_1', webhookSecret, apiBase: `http://127.0.0.1:${port}` });
});
afterAll(() => new Promise((down) => server.close(down)));
beforeEach(() => {
	asked = [];
	replies = [];
});

const wanted = {
	orderId: 'order1',
	schoolId: 'school1',
	quantity: 12,
	unitAmountMinor: 3000,
	currency: 'EUR',
	description: 'Places in Crankpins, spring',
	successUrl: 'http://127.0.0.1/back',
	cancelUrl: 'http://127.0.0.1/cancelled',
	idempotencyKey: 'order1',
	expiresAt: new Date('2026-03-01T10:00:00Z'),
	customerEmail: 'office@averholm.example'
};

it('asks for a checkout that carries the order, the school and the key', async () => {
	expect(await till.createCheckout(wanted)).toEqual({ checkoutId: 'cs_test_1', url: session.url });
	expect(asked[0]?.path).toBe('POST /v1/checkout/sessions');
	expect(asked[0]?.key).toBe('order1');
	expect(Object.fromEntries(asked[0]?.form ?? [])).toEqual({
		mode: 'payment',
		client_reference_id: 'order1',
		'metadata[orderId]': 'order1',
		'metadata[schoolId]': 'school1',
		'payment_intent_data[metadata][orderId]': 'order1',
		'payment_intent_data[metadata][schoolId]': 'school1',
		'line_items[0][quantity]': '12',
		'line_items[0][price_data][currency]': 'eur',
		'line_items[0][price_data][unit_amount]': '3000',
		'line_items[0][price_data][product_data][name]': 'Places in Crankpins, spring',
		success_url: wanted.successUrl,
		cancel_url: wanted.cancelUrl,
		customer_email: wanted.customerEmail,
		expires_at: '1772359200'
	});
});

it('asks again under the same key when the line breaks', async () => {
	replies = [{ status: 0, body: null }];
	await till.createCheckout(wanted);
	expect(asked.map((one) => one.key)).toEqual(['order1', 'order1']);
});

it('reads what is true now', async () => {
	const intent = { id: 'pi_1', object: 'payment_intent', last_payment_error: null };
	replies = [
		{
			status: 200,
			body: { ...session, status: 'complete', payment_status: 'paid', payment_intent: intent }
		},
		{
			status: 200,
			body: {
				...session,
				payment_intent: { ...intent, last_payment_error: { message: 'Your card was declined.' } }
			}
		},
		{ status: 200, body: { ...session, payment_intent: 'pi_2' } }
	];
	expect(await till.readCheckout('cs_test_1')).toEqual({
		checkoutId: 'cs_test_1',
		live: false,
		status: 'complete',
		payment: 'paid',
		paymentId: 'pi_1',
		money: { amountMinor: 36_000, currency: 'EUR' },
		orderId: 'order1',
		schoolId: 'school1',
		fault: null
	});
	expect((await till.readCheckout('cs_test_1')).fault).toBe('Your card was declined.');
	expect((await till.readCheckout('cs_test_1')).paymentId).toBe('pi_2');
});

it('refunds a part or all', async () => {
	replies = [
		{ status: 200, body: { id: 're_1', object: 'refund', status: 'succeeded' } },
		{ status: 200, body: { id: 're_2', object: 'refund', status: 'pending' } }
	];
	const refund = { paymentId: 'pi_1', orderId: 'order1', idempotencyKey: 'refund1' };
	expect(await till.refund({ ...refund, amountMinor: 3000 })).toEqual({
		refundId: 're_1',
		state: 'done'
	});
	expect(await till.refund(refund)).toEqual({ refundId: 're_2', state: 'under-way' });
	expect(asked.map((one) => one.form.get('amount'))).toEqual(['3000', null]);
});

it.each([
	[
		{ status: 400, body: { error: { type: 'invalid_request_error', message: 'No sk_test_1' } } },
		'refused'
	],
	[
		{ status: 401, body: { error: { type: 'invalid_request_error', message: 'Bad key' } } },
		'refused'
	],
	[
		{
			status: 404,
			body: { error: { type: 'invalid_request_error', code: 'resource_missing', message: 'x' } }
		},
		'absent'
	],
	[{ status: 400, body: { error: { type: 'idempotency_error', message: 'x' } } }, 'conflict']
])('words a refusal without repeating it (%#)', async (reply, code) => {
	replies = [reply];
	const refused = await till.createCheckout(wanted).catch((error: unknown) => error);
	expect(refused).toMatchObject({ name: 'Problem', code });
	expect((refused as Error).message).not.toMatch(/sk_test/);
});

it('says when the till cannot be reached', async () => {
	const nowhere = makeTill({
		secretKey: 'sk_test_1',
		webhookSecret,
		apiBase: 'http://127.0.0.1:9'
	});
	await expect(nowhere.readCheckout('cs_test_1')).rejects.toMatchObject({ code: 'unavailable' });
});

it('knows real money by its key', () => {
	expect(makeTill({ secretKey: 'sk_live_1', webhookSecret }).live).toBe(true);
	expect(till.live).toBe(false);
});

const event = JSON.stringify({
	id: 'evt_1',
	object: 'event',
	type: 'checkout.session.completed',
	livemode: false,
	data: { object: session }
});
const { webhooks } = new Stripe('sk_test_1');
const signed = (
	payload: string,
	secret = webhookSecret,
	timestamp = Math.floor(Date.now() / 1000)
) => webhooks.generateTestHeaderString({ payload, secret, timestamp });

it('takes a signed event as a hint', () => {
	expect(till.verifyWebhook(event, signed(event))).toEqual({
		id: 'evt_1',
		kind: 'checkout.session.completed',
		live: false,
		checkoutId: 'cs_test_1',
		orderId: 'order1'
	});
});

it.each([
	['another body', event.replace('cs_test_1', 'cs_test_2'), signed(event)],
	['another secret', event, signed(event, 'whsec_other')],
	['a stale signature', event, signed(event, webhookSecret, Math.floor(Date.now() / 1000) - 3600)],
	['no signature', event, null],
	['a header of noise', event, 't=1,v1=zz']
])('refuses %s', (_name, body, header) => {
	expect(() => till.verifyWebhook(body, header)).toThrow('does not carry the signature');
});
