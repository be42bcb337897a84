import { createHmac } from 'node:crypto';
import { request } from 'node:http';
import { request as secureRequest } from 'node:https';
import { nowS } from './till-store.js';

/** Waits between tries. Stripe's grow to days; a workshop's patience is shorter. */
const waitsMs = [0, 1000, 2000, 5000, 10_000, 30_000, 60_000, 300_000, 900_000, 3_600_000];

/**
 * Stripe's signature scheme v1: HMAC-SHA256 over "<seconds>.<body>".
 * https://docs.stripe.com/webhooks#verify-manually
 * @param {string} secret
 * @param {string} body
 */
export function signatureOf(secret, body, atS = nowS()) {
	const digest = createHmac('sha256', secret).update(`${atS}.${body}`).digest('hex');
	return `t=${atS},v1=${digest}`;
}

/**
 * Sends events to the one address that listens, each until it is taken with a 2xx. What still
 * waits is kept with the till's state, so a restart loses none.
 * @param {import('./till-store.js').TillStore} store
 * @param {{ url: string, host?: string, secret: string }} to host is the name the server answers to
 */
export function webhooks(store, to) {
	let held = false;
	/** @type {NodeJS.Timeout | undefined} */
	let timer;
	let busy = false;

	/** @param {string} eventId @returns {Promise<number | string>} the status, or why there is none */
	function deliver(eventId) {
		const event = store.state.things[eventId];
		return event ? post(to, JSON.stringify(event)) : Promise.resolve('no such event');
	}

	function plan() {
		clearTimeout(timer);
		const next = Math.min(...store.state.deliveries.map((one) => one.nextAtMs));
		if (held || busy || next === Infinity) return;
		timer = setTimeout(() => void work(), Math.max(0, next - Date.now()));
		timer.unref();
	}

	async function work() {
		busy = true;
		const due = store.state.deliveries.filter((one) => one.nextAtMs <= Date.now());
		for (const delivery of due) {
			const status = await deliver(delivery.eventId);
			delivery.tries += 1;
			const wait = waitsMs[delivery.tries];
			const taken = typeof status === 'number' && status >= 200 && status < 300;
			const event = store.state.things[delivery.eventId];
			if (event) event.pending_webhooks = taken ? 0 : 1;
			delivery.nextAtMs = Date.now() + (wait ?? 0);
			if (taken || wait === undefined)
				store.state.deliveries = store.state.deliveries.filter((one) => one !== delivery);
		}
		store.save();
		busy = false;
		plan();
	}

	return {
		/** @param {string} type @param {unknown} object */
		tell(type, object) {
			const event = store.add('evt', 'event', {
				api_version: '2026-01-28.stand-in',
				data: { object: structuredClone(object) },
				pending_webhooks: 1,
				request: { id: null, idempotency_key: null },
				type
			});
			store.state.deliveries.push({ eventId: event.id, tries: 0, nextAtMs: Date.now() });
			plan();
		},
		/** For tests: nothing leaves while held. @param {boolean} on */
		hold(on) {
			held = on;
			plan();
		},
		/** For tests: again, at once, in this order, whatever was delivered before. @param {string[]} eventIds */
		async resend(eventIds) {
			/** @type {(number | string)[]} */
			const statuses = [];
			for (const id of eventIds) statuses.push(await deliver(id));
			return statuses;
		},
		plan,
		stop() {
			held = true;
			clearTimeout(timer);
		}
	};
}

/**
 * @param {{ url: string, host?: string, secret: string }} to
 * @param {string} body
 * @returns {Promise<number | string>}
 */
function post({ url, host, secret }, body) {
	return new Promise((resolve) => {
		const ask = url.startsWith('https:') ? secureRequest : request;
		const sent = ask(url, {
			method: 'POST',
			agent: false,
			timeout: 10_000,
			headers: {
				'content-type': 'application/json; charset=utf-8',
				'content-length': Buffer.byteLength(body),
				'stripe-signature': signatureOf(secret, body),
				...(host ? { host } : {})
			}
		});
		sent.once('response', (response) => {
			response.resume();
			resolve(response.statusCode ?? 0);
		});
		sent.once('timeout', () => sent.destroy(new Error('no answer in time')));
		sent.once('error', (error) => resolve(error.message));
		sent.end(body);
	});
}
