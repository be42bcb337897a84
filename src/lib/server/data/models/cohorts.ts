import { instant, integer, json, key, nullable, schoolTable, commonTable, text } from '../table';

export const cohorts = schoolTable('cohorts', {
	id: key(),
	courseId: text(),
	courseRevisionId: text(),
	title: text(),
	startsOn: text(),
	endsOn: text(),
	instructorId: text(),
	priceMinor: integer(),
	currency: text(),
	createdAt: instant()
});

export type OrderMethod = 'card' | 'bank-transfer' | 'purchase-order';
export type OrderState = 'intended' | 'open' | 'paid' | 'refused' | 'expired' | 'cancelled';

/** A purchase of places. Its id is the idempotency key of the call to the till. */
export const orders = schoolTable('orders', {
	id: key(),
	cohortId: text(),
	quantity: integer(),
	amountMinor: integer(),
	currency: text(),
	method: text<OrderMethod>(),
	state: text<OrderState>(),
	reference: nullable(text()),
	checkoutId: nullable(text()),
	checkoutUrl: nullable(text()),
	paymentId: nullable(text()),
	fault: nullable(text()),
	createdBy: text(),
	createdAt: instant(),
	settledAt: nullable(instant())
});

/** The paid right to one enrolment: a row exists only once its order is paid. */
export const places = schoolTable('places', {
	id: key(),
	cohortId: text(),
	orderId: text(),
	number: integer(),
	openedAt: instant()
});

export type RosterState = 'waiting' | 'invited' | 'enrolled' | 'withdrawn';

export const rosterEntries = schoolTable('roster_entries', {
	id: key(),
	cohortId: text(),
	email: text(),
	name: text(),
	studentNumber: nullable(text()),
	placeId: nullable(text()),
	state: text<RosterState>(),
	invitedAt: nullable(instant()),
	createdAt: instant()
});

export const enrolments = schoolTable('enrolments', {
	id: key(),
	cohortId: text(),
	personId: text(),
	placeId: text(),
	rosterEntryId: nullable(text()),
	enrolledAt: instant()
});

/** Payment events as they arrived, each stored once; a job re-reads the truth from the till. */
export const paymentEvents = commonTable('payment_events', {
	id: key(),
	kind: text(),
	checkoutId: nullable(text()),
	receivedAt: instant(),
	handledAt: nullable(instant()),
	outcome: nullable(text()),
	hint: json<unknown>()
});
