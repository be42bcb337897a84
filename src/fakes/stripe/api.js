import { createHash } from 'node:crypto';
import { listOf, treeOf } from './form-body.js';
import { expire, refund } from './payments.js';
import { missing, Refusal } from './refusal.js';
import { createSession, shownSession } from './sessions.js';

/**
 * The endpoints that Ringland's gateway uses, as Stripe answers them.
 * @typedef {object} Asked
 * @property {string} method
 * @property {string} path
 * @property {string} query
 * @property {string} body
 * @property {string | undefined} idempotencyKey
 *
 * @typedef {object} ApiParts
 * @property {import('./till-store.js').TillStore} store
 * @property {import('./payments.js').Tell} tell
 * @property {() => string} pageOrigin
 */

/**
 * A key that was used before gets the answer that it got, or a refusal when the request differs.
 * @param {ApiParts} parts
 * @param {Asked} asked
 * @returns {{ status: number, body: unknown, replayed: boolean }}
 */
export function answerApi(parts, asked) {
	const { method, path, body, idempotencyKey: key } = asked;
	const { answered } = parts.store.state;
	const fingerprint = createHash('sha256').update(`${method} ${path}\n${body}`).digest('hex');
	const before = key && method === 'POST' ? answered[key] : undefined;
	if (before && before.fingerprint !== fingerprint)
		return { ...said(differs(key ?? '')), replayed: false };
	if (before) return { status: before.status, body: before.body, replayed: true };
	const answer = attempt(parts, asked);
	// A refused parameter may be mended under the same key, as with Stripe itself.
	if (key && method === 'POST' && answer.status < 400)
		answered[key] = { fingerprint, ...answer, atMs: Date.now() };
	parts.store.save();
	return { ...answer, replayed: false };
}

/** @param {ApiParts} parts @param {Asked} asked */
function attempt(parts, asked) {
	try {
		return { status: 200, body: act(parts, asked) };
	} catch (error) {
		if (error instanceof Refusal) return said(error);
		throw error;
	}
}

/** @param {Refusal} refusal */
const said = ({ status, error }) => ({ status, body: { error } });

/** @param {string} key */
const differs = (key) =>
	new Refusal(400, {
		type: 'idempotency_error',
		message: `Keys for idempotent requests can only be used with the same parameters they were first used with. (Key: ${key})`
	});

/** @param {ApiParts} parts @param {Asked} asked @returns {unknown} */
function act({ store, tell, pageOrigin }, { method, path, query, body }) {
	const form = treeOf(body);
	const expand = listOf(treeOf(query).expand).filter((one) => typeof one === 'string');
	const [, , kind = '', ...rest] = path.split('/');
	const where = `${method} ${kind}/${rest.length > 0 ? rest.map((one) => (/_/.test(one) ? ':id' : one)).join('/') : ''}`;
	const id = rest.find((one) => one.includes('_')) ?? '';

	switch (where) {
		case 'POST checkout/sessions':
			return shownSession(store, createSession(store, form, pageOrigin()));
		case 'GET checkout/sessions/:id':
			return shownSession(store, found(store, 'checkout.session', id), expand);
		case 'POST checkout/sessions/:id/expire': {
			const session = found(store, 'checkout.session', id);
			if (session.status !== 'open')
				throw new Refusal(400, {
					message: `Only Checkout Sessions with a status in ["open"] can be expired. This one has a status of ${session.status}.`
				});
			expire(store, session, tell);
			return shownSession(store, session);
		}
		case 'GET payment_intents/:id':
			return found(store, 'payment_intent', id);
		case 'GET charges/:id':
			return found(store, 'charge', id);
		case 'POST refunds/':
			return refund(store, form, tell);
		case 'GET refunds/:id':
			return found(store, 'refund', id);
		case 'GET events/:id':
			return found(store, 'event', id);
		default:
			throw new Refusal(404, { message: `Unrecognized request URL (${method}: ${path}).` });
	}
}

/** @param {import('./till-store.js').TillStore} store @param {string} object @param {string} id */
function found(store, object, id) {
	const thing = store.find(id, object);
	if (!thing) throw missing(object, id);
	return thing;
}
