import { branchOf, textOf, wordsOf } from './form-body.js';
import { missing, Refusal, wrong } from './refusal.js';
import { shownSession } from './sessions.js';
import { nowS } from './till-store.js';

/**
 * @typedef {import('./till-store.js').Thing} Thing
 * @typedef {import('./till-store.js').TillStore} TillStore
 * @typedef {(type: string, object: unknown) => void} Tell announces an event
 */

export const cardThatPays = '4242424242424242';
export const cardThatIsRefused = '4000000000000002';

/**
 * One try at a checkout with a card.
 * @param {TillStore} store
 * @param {Thing} session open
 * @param {string} card digits
 * @param {Tell} tell
 * @returns {{ paid: true } | { paid: false, because: string }}
 */
export function payWith(store, session, card, tell) {
	if (card !== cardThatPays && card !== cardThatIsRefused)
		return { paid: false, because: 'This stand-in knows only the two test cards named below.' };
	const intent = intentOf(store, session);
	if (card === cardThatIsRefused) {
		intent.status = 'requires_payment_method';
		intent.last_payment_error = {
			type: 'card_error',
			code: 'card_declined',
			decline_code: 'generic_decline',
			message: 'Your card was declined.'
		};
		tell('payment_intent.payment_failed', intent);
		return { paid: false, because: 'The card was refused. Nothing was charged.' };
	}
	const charge = store.add('ch', 'charge', {
		amount: intent.amount,
		amount_refunded: 0,
		currency: intent.currency,
		metadata: intent.metadata,
		paid: true,
		payment_intent: intent.id,
		refunded: false,
		status: 'succeeded'
	});
	Object.assign(intent, {
		amount_received: intent.amount,
		last_payment_error: null,
		latest_charge: charge.id,
		status: 'succeeded'
	});
	Object.assign(session, { payment_status: 'paid', status: 'complete' });
	tell('checkout.session.completed', shownSession(store, session));
	return { paid: true };
}

/** Made at the first try to pay, as Stripe does. @param {TillStore} store @param {Thing} session */
function intentOf(store, session) {
	const found = store.find(session.payment_intent, 'payment_intent');
	if (found) return found;
	const intent = store.add('pi', 'payment_intent', {
		amount: session.amount_total,
		amount_received: 0,
		currency: session.currency,
		last_payment_error: null,
		latest_charge: null,
		metadata: session.payment_intent_metadata,
		payment_method_types: ['card'],
		status: 'requires_payment_method'
	});
	session.payment_intent = intent.id;
	return intent;
}

/** @param {TillStore} store @param {Thing} session @param {Tell} tell */
export function expire(store, session, tell) {
	session.status = 'expired';
	tell('checkout.session.expired', shownSession(store, session));
}

/** Checkouts whose time is over. @param {TillStore} store @param {Tell} tell */
export function expireOverdue(store, tell) {
	const overdue = store
		.all('checkout.session')
		.filter((one) => one.status === 'open' && one.expires_at <= nowS());
	for (const session of overdue) expire(store, session, tell);
	return overdue.length > 0;
}

/**
 * @param {TillStore} store
 * @param {import('./form-body.js').FormTree} form
 * @param {Tell} tell
 */
export function refund(store, form, tell) {
	const intentId = textOf(form.payment_intent) ?? '';
	const intent = store.find(intentId, 'payment_intent');
	if (!intent) throw missing('payment_intent', intentId);
	const charge = store.find(intent.latest_charge, 'charge');
	if (!charge)
		throw new Refusal(400, {
			code: 'payment_intent_unexpected_state',
			message: 'This PaymentIntent does not have a successful charge to refund.'
		});
	const left = charge.amount - charge.amount_refunded;
	const asked = textOf(form.amount);
	const amount = asked === null ? left : Number(asked);
	if (left === 0)
		throw new Refusal(400, {
			code: 'charge_already_refunded',
			message: `Charge ${charge.id} has already been refunded.`
		});
	if (!Number.isInteger(amount) || amount < 1) throw wrong('amount', 'Invalid positive integer');
	if (amount > left)
		throw wrong('amount', `Refund amount (${amount}) is greater than unrefunded amount (${left}).`);
	const made = store.add('re', 'refund', {
		amount,
		charge: charge.id,
		currency: charge.currency,
		metadata: wordsOf(branchOf(form.metadata)),
		payment_intent: intent.id,
		reason: textOf(form.reason),
		status: 'succeeded'
	});
	charge.amount_refunded += amount;
	charge.refunded = charge.amount_refunded === charge.amount;
	tell('charge.refunded', charge);
	return made;
}
