import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, get, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { text } from 'node:stream/consumers';
import Stripe from 'stripe';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { makeTill, type CheckoutWanted, type PaymentEvent } from '$lib/server/gateways/stripe';
import { startFakeTill } from '../../src/fakes/stripe/fake-till.js';

const secretKey = 'sk_test_standin';
const webhookSecret = 'whsec_of_this_test';

let folder: string;
let fake: Awaited<ReturnType<typeof startFakeTill>>;
let school: Server;
let heard: PaymentEvent[];
let refusals: number;

beforeEach(async () => {
	folder = await mkdtemp(join(tmpdir(), 'till-'));
	heard = [];
	refusals = 0;
	school = createServer((request, response) => {
		void text(request).then((body) => {
			const signature = request.headers['stripe-signature'];
			if (refusals > 0) {
				refusals -= 1;
				return response.writeHead(500).end();
			}
			// The gateway's own check, so a wrong signature scheme cannot pass here.
			heard.push(gateway().verifyWebhook(body, String(signature)));
			response.writeHead(200).end();
		});
	});
	await new Promise<void>((up) => school.listen(0, '127.0.0.1', up));
	fake = await startFakeTill(settings());
});

afterEach(async () => {
	await fake.close();
	school.closeAllConnections();
	await new Promise((down) => school.close(down));
	await rm(folder, { recursive: true });
});

function settings() {
	const { port } = school.address() as AddressInfo;
	return {
		port: 0,
		secretKey,
		webhookSecret,
		webhookUrl: `http://127.0.0.1:${port}/api/v1/stripe/webhook`,
		stateFile: join(folder, 'till.json')
	};
}

const gateway = () => makeTill({ secretKey, webhookSecret, apiBase: fake.url });
const kinds = () => heard.map((one) => one.kind);

function wanted(more: Partial<CheckoutWanted> = {}): CheckoutWanted {
	return {
		orderId: 'order1',
		schoolId: 'school1',
		quantity: 12,
		unitAmountMinor: 3000,
		currency: 'EUR',
		description: 'Places in Crankpins & clearances',
		successUrl: 'http://127.0.0.1:1/paid?checkout={CHECKOUT_SESSION_ID}',
		cancelUrl: 'http://127.0.0.1:1/places',
		idempotencyKey: 'intent1',
		...more
	};
}

function pay(url: string, card: string) {
	return fetch(url, { method: 'POST', body: new URLSearchParams({ card }), redirect: 'manual' });
}

it('takes the test card, sends the buyer back and tells the school with a signature', async () => {
	const { checkoutId, url } = await gateway().createCheckout(wanted());
	expect(await (await fetch(url)).text()).toContain('Pay 360.00 EUR');
	expect((await gateway().readCheckout(checkoutId)).payment).toBe('unpaid');

	const paid = await pay(url, '4242 4242 4242 4242');

	expect(paid.status).toBe(303);
	expect(paid.headers.get('location')).toBe(`http://127.0.0.1:1/paid?checkout=${checkoutId}`);
	expect(await gateway().readCheckout(checkoutId)).toEqual({
		checkoutId,
		live: false,
		status: 'complete',
		payment: 'paid',
		paymentId: expect.stringMatching(/^pi_/),
		money: { amountMinor: 36_000, currency: 'EUR' },
		orderId: 'order1',
		schoolId: 'school1',
		fault: null
	});
	await vi.waitFor(() => expect(kinds()).toEqual(['checkout.session.completed']));
	expect(heard[0]).toMatchObject({ checkoutId, orderId: 'order1', live: false });
});

it('refuses the refused card, keeps the checkout open and lets a good card follow', async () => {
	const { checkoutId, url } = await gateway().createCheckout(wanted());
	const refused = await pay(url, '4000000000000002');
	expect(refused.status).toBe(402);
	expect(await refused.text()).toContain('The card was refused');
	expect(await gateway().readCheckout(checkoutId)).toMatchObject({
		status: 'open',
		payment: 'unpaid',
		fault: 'Your card was declined.'
	});
	expect((await pay(url, '4111111111111111')).status).toBe(402);
	expect((await pay(url, '4242424242424242')).status).toBe(303);
	await vi.waitFor(() =>
		expect(kinds()).toEqual(['payment_intent.payment_failed', 'checkout.session.completed'])
	);
	expect(await (await pay(url, '4242424242424242')).text()).toContain('already paid');
	expect(heard).toHaveLength(2);
});

it('answers a repeated key as before and refuses it for other figures', async () => {
	const first = await gateway().createCheckout(wanted());
	expect(await gateway().createCheckout(wanted())).toEqual(first);
	await expect(gateway().createCheckout(wanted({ quantity: 13 }))).rejects.toMatchObject({
		code: 'conflict'
	});
});

it('pays back in parts and never more than was paid', async () => {
	const { checkoutId, url } = await gateway().createCheckout(wanted());
	await pay(url, '4242424242424242');
	const { paymentId } = await gateway().readCheckout(checkoutId);
	const refund = { paymentId: paymentId ?? '', orderId: 'order1' };
	const part = await gateway().refund({ ...refund, amountMinor: 6000, idempotencyKey: 'r1' });
	expect(part).toEqual({ refundId: expect.stringMatching(/^re_/), state: 'done' });
	await expect(
		gateway().refund({ ...refund, amountMinor: 30_001, idempotencyKey: 'r2' })
	).rejects.toMatchObject({ code: 'refused' });
	await gateway().refund({ ...refund, idempotencyKey: 'r3' });
	await vi.waitFor(() =>
		expect(kinds()).toEqual(['checkout.session.completed', 'charge.refunded', 'charge.refunded'])
	);
	expect(heard[2]?.orderId).toBe('order1');
});

it('sends an event again until it is taken, and after a restart too', async () => {
	refusals = 1;
	const { url } = await gateway().createCheckout(wanted());
	await pay(url, '4242424242424242');
	await vi.waitFor(() => expect(refusals).toBe(0));
	await fake.close();
	expect(heard).toEqual([]);
	fake = await startFakeTill(settings());
	await vi.waitFor(() => expect(kinds()).toEqual(['checkout.session.completed']), {
		timeout: 5000
	});
});

it('can be held, and made to send twice and out of order', async () => {
	await forTests('hold', { on: true });
	const { url } = await gateway().createCheckout(wanted());
	await pay(url, '4000000000000002');
	await pay(url, '4242424242424242');
	const events = await stripe().events.retrieve(idOf(await forTests('events'), 1));
	expect(events.type).toBe('checkout.session.completed');
	const ids = (await forTests('events')).map((one: { id: string }) => one.id);
	expect(heard).toEqual([]);
	await forTests('resend', { eventIds: [ids[1], ids[0], ids[1]] });
	expect(kinds()).toEqual([
		'checkout.session.completed',
		'payment_intent.payment_failed',
		'checkout.session.completed'
	]);
	expect(heard[0]?.id).toBe(heard[2]?.id);
});

it('ends an open checkout and says so once', async () => {
	const { checkoutId, url } = await gateway().createCheckout(wanted());
	await stripe().checkout.sessions.expire(checkoutId);
	await expect(stripe().checkout.sessions.expire(checkoutId)).rejects.toThrow(/can be expired/);
	expect((await gateway().readCheckout(checkoutId)).status).toBe('expired');
	expect(await (await pay(url, '4242424242424242')).text()).toContain('is over');
	await vi.waitFor(() => expect(kinds()).toEqual(['checkout.session.expired']));
});

it('refuses another key, what it does not know and figures that make no sense', async () => {
	const stranger = makeTill({ secretKey: 'sk_test_other', webhookSecret, apiBase: fake.url });
	await expect(stranger.createCheckout(wanted())).rejects.toMatchObject({ code: 'refused' });
	await expect(gateway().readCheckout('cs_test_unknown')).rejects.toMatchObject({
		code: 'absent'
	});
	for (const [index, wrong] of [{ quantity: 0 }, { unitAmountMinor: 0.5 }].entries())
		await expect(
			gateway().createCheckout(wanted({ ...wrong, idempotencyKey: `wrong${index}` }))
		).rejects.toMatchObject({ code: 'refused' });
});

it('answers only to the names of the loopback', async () => {
	const { port } = new URL(fake.url);
	const ask = (host: string) =>
		new Promise((resolve) =>
			get({ port, host: '127.0.0.1', headers: { host } }, (response) => {
				response.resume();
				resolve(response.statusCode);
			})
		);
	expect(await ask(`localhost:${port}`)).toBe(200);
	expect(await ask('till.example')).toBe(403);
});

function stripe() {
	const { hostname, port } = new URL(fake.url);
	return new Stripe(secretKey, { host: hostname, port, protocol: 'http', telemetry: false });
}

async function forTests(hook: string, body?: unknown) {
	const response = await fetch(`${fake.url}/fake/${hook}`, {
		method: 'POST',
		headers: { authorization: `Bearer ${secretKey}` },
		body: body === undefined ? undefined : JSON.stringify(body)
	});
	expect(response.status).toBe(200);
	return response.json();
}

const idOf = (events: { id: string }[], index: number) => events[index]?.id ?? '';
