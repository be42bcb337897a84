import { timingSafeEqual } from 'node:crypto';
import { createServer } from 'node:http';
import { closeNow, listenOnLoopback, portOf } from '../listen.js';
import { isAskedLocally, sendHtml, sendJson } from '../page.js';
import { answerApi } from './api.js';
import { expireOverdue, payWith } from './payments.js';
import { listPage, overPage, payPage, successAddress } from './till-pages.js';
import { tillStore } from './till-store.js';
import { webhooks } from './webhooks.js';

/**
 * @typedef {object} TillSettings
 * @property {number} port
 * @property {string} secretKey
 * @property {string} webhookSecret
 * @property {string} webhookUrl
 * @property {string} [webhookHost] the name that the server answers to, where it differs from the address
 * @property {string} stateFile
 */

/**
 * Stripe as far as Ringland uses it: the API for its SDK, a page of its own to pay at, signed
 * webhooks with retries. Under /fake/ are hooks for tests, behind the same key as the API:
 * `GET events`, `POST resend {eventIds}`, `POST hold {on}`.
 * @param {TillSettings} settings port may be 0
 */
export async function startFakeTill(settings) {
	const store = tillStore(settings.stateFile);
	const hooks = webhooks(store, {
		url: settings.webhookUrl,
		host: settings.webhookHost,
		secret: settings.webhookSecret
	});
	const server = createServer((request, response) => {
		answer(request, response).catch((error) => {
			sendJson(response, 500, { error: { type: 'api_error', message: String(error) } });
		});
	});
	await listenOnLoopback(server, settings.port);
	const url = `http://127.0.0.1:${portOf(server)}`;
	const overdue = setInterval(() => expireOverdue(store, hooks.tell) && store.save(), 5000);
	overdue.unref();
	hooks.plan();

	/**
	 * @param {import('node:http').IncomingMessage} request
	 * @param {import('node:http').ServerResponse} response
	 */
	async function answer(request, response) {
		if (!isAskedLocally(request))
			return sendJson(response, 403, { error: 'Ask for the loopback.' });
		const { pathname, search } = new URL(request.url ?? '/', url);
		const body = await bodyOf(request);
		if (expireOverdue(store, hooks.tell)) store.save();
		if (pathname === '/')
			return sendHtml(response, 200, listPage(store.all('checkout.session'), store.all('event')));
		if (pathname.startsWith('/till/')) return till(request, response, pathname, body);
		if (!hasKey(request, settings.secretKey))
			return sendJson(response, 401, {
				error: { type: 'invalid_request_error', message: 'Invalid API Key provided' }
			});
		if (pathname.startsWith('/fake/')) return forTests(response, pathname, body);
		const key = request.headers['idempotency-key'];
		const answered = answerApi(
			{ store, tell: hooks.tell, pageOrigin: () => url },
			{
				method: request.method ?? 'GET',
				path: pathname,
				query: search,
				body,
				idempotencyKey: typeof key === 'string' ? key : undefined
			}
		);
		sendJson(response, answered.status, answered.body, {
			'request-id': `req_${Date.now().toString(36)}`,
			...(answered.replayed ? { 'idempotent-replayed': 'true' } : {})
		});
	}

	/**
	 * @param {import('node:http').IncomingMessage} request
	 * @param {import('node:http').ServerResponse} response
	 * @param {string} pathname
	 * @param {string} body
	 */
	function till(request, response, pathname, body) {
		const session = store.find(pathname.slice('/till/'.length), 'checkout.session');
		if (!session) return sendHtml(response, 404, listPage([], []));
		if (session.status !== 'open') return sendHtml(response, 200, overPage(session));
		// Browsers hold a form's redirect to form-action too.
		const policy = `form-action 'self' ${new URL(session.success_url).origin}`;
		if (request.method !== 'POST') return sendHtml(response, 200, payPage(session), policy);
		const card = (new URLSearchParams(body).get('card') ?? '').replace(/\D/g, '');
		const tried = payWith(store, session, card, hooks.tell);
		store.save();
		if (!tried.paid) return sendHtml(response, 402, payPage(session, tried.because), policy);
		response.writeHead(303, { location: successAddress(session) });
		response.end();
	}

	/**
	 * @param {import('node:http').ServerResponse} response
	 * @param {string} pathname
	 * @param {string} body
	 */
	async function forTests(response, pathname, body) {
		const wanted = body ? JSON.parse(body) : {};
		if (pathname === '/fake/events')
			return sendJson(response, 200, store.all('event').toReversed());
		if (pathname === '/fake/hold') {
			hooks.hold(wanted.on === true);
			return sendJson(response, 200, { held: wanted.on === true });
		}
		if (pathname === '/fake/resend')
			return sendJson(response, 200, { statuses: await hooks.resend(wanted.eventIds) });
		sendJson(response, 404, { error: 'No such hook.' });
	}

	return {
		url,
		store,
		hooks,
		async close() {
			clearInterval(overdue);
			hooks.stop();
			await closeNow(server);
		}
	};
}

/** @param {import('node:http').IncomingMessage} request @param {string} key */
function hasKey({ headers }, key) {
	const given = Buffer.from(headers.authorization ?? '');
	const wanted = Buffer.from(`Bearer ${key}`);
	return given.length === wanted.length && timingSafeEqual(given, wanted);
}

/** @param {import('node:http').IncomingMessage} request */
async function bodyOf(request) {
	/** @type {Buffer[]} */
	const parts = [];
	for await (const part of request) parts.push(part);
	return Buffer.concat(parts).toString('utf8');
}
