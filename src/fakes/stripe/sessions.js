import { branchOf, listOf, textOf, wordsOf } from './form-body.js';
import { wrong, Refusal } from './refusal.js';
import { nowS } from './till-store.js';

/** @typedef {import('./till-store.js').Thing} Thing */

const halfHourS = 1800;
const dayS = 86_400;

/**
 * A checkout to be paid, refused where Stripe would refuse it.
 * @param {import('./till-store.js').TillStore} store
 * @param {import('./form-body.js').FormTree} form
 * @param {string} pageOrigin
 */
export function createSession(store, form, pageOrigin) {
	if (form.mode !== 'payment') throw wrong('mode', 'This stand-in takes single payments only.');
	const successUrl = addressIn(form, 'success_url');
	if (!successUrl) throw wrong('success_url', 'Missing required param: success_url.');
	const lines = listOf(form.line_items).map(lineOf);
	const currencies = new Set(lines.map((one) => one.currency));
	if (lines.length === 0) throw wrong('line_items', 'Missing required param: line_items.');
	if (currencies.size > 1) throw wrong('line_items', 'All prices must use the same currency.');
	const total = lines.reduce((sum, one) => sum + one.amount_total, 0);
	if (total < 50)
		throw wrong('line_items', 'The total amount must be at least 50 of the smallest unit.');
	const session = store.add('cs_test', 'checkout.session', {
		amount_subtotal: total,
		amount_total: total,
		cancel_url: addressIn(form, 'cancel_url'),
		client_reference_id: textOf(form.client_reference_id),
		currency: lines[0]?.currency,
		customer: null,
		customer_email: textOf(form.customer_email),
		expires_at: expiryIn(form),
		line_items: { object: 'list', data: lines, has_more: false },
		metadata: wordsOf(form.metadata),
		mode: 'payment',
		payment_intent: null,
		payment_intent_metadata: wordsOf(branchOf(form.payment_intent_data).metadata),
		payment_method_types: ['card'],
		payment_status: 'unpaid',
		status: 'open',
		success_url: successUrl
	});
	session.url = `${pageOrigin}/till/${session.id}`;
	return session;
}

/** @param {import('./form-body.js').FormTree | string} tree */
function lineOf(tree) {
	const line = branchOf(tree);
	const price = branchOf(line.price_data);
	const quantity = Number(textOf(line.quantity) ?? Number.NaN);
	const unitAmount = Number(textOf(price.unit_amount) ?? Number.NaN);
	const currency = textOf(price.currency) ?? '';
	if (!Number.isInteger(quantity) || quantity < 1)
		throw wrong('line_items[0][quantity]', 'Quantity must be a whole number from 1.');
	if (!Number.isInteger(unitAmount) || unitAmount < 0)
		throw wrong('line_items[0][price_data][unit_amount]', 'Invalid integer: unit_amount.');
	if (!/^[a-z]{3}$/.test(currency))
		throw wrong('line_items[0][price_data][currency]', `Invalid currency: ${currency}.`);
	return {
		object: 'item',
		amount_total: quantity * unitAmount,
		currency,
		description: textOf(branchOf(price.product_data).name) ?? '',
		quantity,
		price: { unit_amount: unitAmount, currency }
	};
}

/** @param {import('./form-body.js').FormTree} form @param {string} name */
function addressIn(form, name) {
	const text = textOf(form[name]);
	if (text !== null && !(URL.canParse(text) && /^https?:/.test(text)))
		throw new Refusal(400, { code: 'url_invalid', message: 'Not a valid URL', param: name });
	return text;
}

/** @param {import('./form-body.js').FormTree} form */
function expiryIn(form) {
	const text = textOf(form.expires_at);
	if (text === null) return nowS() + dayS;
	const at = Number(text);
	// The clocks of two machines differ by seconds.
	if (!Number.isInteger(at) || at < nowS() + halfHourS - 60 || at > nowS() + dayS + 60)
		throw wrong('expires_at', 'expires_at must be between 30 minutes and 24 hours from now.');
	return at;
}

/**
 * As a reader gets it: our own notes left out, the payment written out when it is asked for.
 * @param {import('./till-store.js').TillStore} store
 * @param {Thing} session
 * @param {string[]} expand
 */
export function shownSession(store, session, expand = []) {
	const { payment_intent_metadata: _, line_items: lines, ...shown } = session;
	const intent = store.state.things[session.payment_intent];
	return {
		...shown,
		url: session.status === 'open' ? session.url : null,
		payment_intent: expand.includes('payment_intent') && intent ? intent : session.payment_intent,
		...(expand.includes('line_items') ? { line_items: lines } : {})
	};
}
