import { z } from 'zod';
import { Problem } from '$lib/domain/problem';
import { changeOrder, findCohort, findOrder } from '../../data/queries/cohorts';
import { schoolById } from '../../data/queries/schools';
import { orders } from '../../data/models';
import { insert } from '../../data/rows';
import type { SchoolScope } from '../../data/scope';
import { writeCase, type Caller } from '../use-case';
import { openPlaces } from './open-places';

const quantity = z.coerce
	.number('Say how many places.')
	.int('Places are whole.')
	.min(1, 'Buy at least one place.')
	.max(500, 'Buy at most 500 places at a time.');

async function cohortHere({ scope, input }: { scope: SchoolScope; input: { cohortId: string } }) {
	const cohort = await findCohort(scope, input.cohortId);
	return cohort && { schoolId: scope.schoolId, cohort };
}

/** First of three steps: the intent is on disk before the till hears of it. */
const intendOrder = writeCase({
	name: 'intend-order',
	action: 'place:buy',
	input: z.object({ cohortId: z.string(), quantity }),
	subject: cohortHere,
	async run({ scope, subject: { cohort }, input, me, at, newId, record }) {
		const id = newId();
		const amountMinor = input.quantity * cohort.priceMinor;
		await insert(scope, orders, {
			id,
			cohortId: cohort.id,
			quantity: input.quantity,
			amountMinor,
			currency: cohort.currency,
			method: 'card',
			state: 'intended',
			reference: null,
			checkoutId: null,
			checkoutUrl: null,
			paymentId: null,
			fault: null,
			createdBy: me,
			createdAt: at.toISOString(),
			settledAt: null
		});
		await record({
			kind: 'order-intended',
			subject: id,
			data: { quantity: input.quantity, amountMinor }
		});
		const school = await schoolById(scope, scope.schoolId);
		return {
			orderId: id,
			unitAmountMinor: cohort.priceMinor,
			currency: cohort.currency,
			description: `${cohort.courseTitle}: ${cohort.title}`,
			schoolSlug: school?.slug ?? ''
		};
	}
});

/** Third: what the till answered. */
const keepCheckout = writeCase({
	name: 'keep-checkout',
	action: 'place:buy',
	input: z.object({
		orderId: z.string(),
		answer: z.union([
			z.object({ checkoutId: z.string(), url: z.string() }),
			z.object({ fault: z.string() })
		])
	}),
	async subject({ scope, input }) {
		const order = await findOrder(scope, input.orderId);
		return order && { schoolId: scope.schoolId, order };
	},
	async run({ scope, subject: { order }, input: { answer } }) {
		// The webhook may have been faster: an order that is paid already stays so.
		if (order.state !== 'intended') return { state: order.state };
		if ('fault' in answer)
			await changeOrder(scope, order.id, { state: 'cancelled', fault: answer.fault });
		else
			await changeOrder(scope, order.id, {
				state: 'open',
				checkoutId: answer.checkoutId,
				checkoutUrl: answer.url
			});
		return { state: 'open' };
	}
});

/**
 * Buys places by card: intent, call to the till under the order's id as its idempotency key,
 * answer. @returns where to send the person to pay
 */
export async function buyPlaces(caller: Caller, input: unknown): Promise<{ url: string }> {
	const { requestKey, ...rest } = caller;
	const intent = await intendOrder(caller, input);
	const { ORIGIN } = caller.house.config;
	const back = `${ORIGIN}/s/${intent.schoolSlug}/cohorts/${cohortIdOf(input)}`;
	try {
		const checkout = await caller.house.gateways.till.createCheckout({
			orderId: intent.orderId,
			schoolId: caller.schoolId ?? '',
			quantity: quantityOf(input),
			unitAmountMinor: intent.unitAmountMinor,
			currency: intent.currency,
			description: intent.description,
			successUrl: `${back}?order=${intent.orderId}`,
			cancelUrl: `${back}?cancelled=${intent.orderId}`,
			idempotencyKey: intent.orderId
		});
		await keepCheckout(rest, { orderId: intent.orderId, answer: checkout });
		return { url: checkout.url };
	} catch (error) {
		const fault = error instanceof Problem ? error.words : 'The till did not answer.';
		await keepCheckout(rest, { orderId: intent.orderId, answer: { fault } });
		throw error;
	}
}

const cohortIdOf = (input: unknown) => z.object({ cohortId: z.string() }).parse(input).cohortId;
const quantityOf = (input: unknown) => z.object({ quantity }).parse(input).quantity;

/** A payment that came another way. Whoever records it answers for it: it stands in the ledger. */
export const recordPayment = writeCase({
	name: 'record-payment',
	action: 'place:record',
	input: z.object({
		cohortId: z.string(),
		quantity,
		method: z.enum(['bank-transfer', 'purchase-order'], 'Say how it was paid.'),
		reference: z
			.string()
			.trim()
			.min(1, 'Give the number on the transfer or the purchase order.')
			.max(120)
	}),
	subject: cohortHere,
	async run({ subject: { cohort }, input, me, ...work }) {
		const id = work.newId();
		const order = {
			id,
			cohortId: cohort.id,
			quantity: input.quantity,
			amountMinor: input.quantity * cohort.priceMinor,
			currency: cohort.currency
		};
		const { scope, at, record } = work;
		await insert(scope, orders, {
			...order,
			method: input.method,
			state: 'intended',
			reference: input.reference,
			checkoutId: null,
			checkoutUrl: null,
			paymentId: null,
			fault: null,
			createdBy: me,
			createdAt: at.toISOString(),
			settledAt: null
		});
		await record({
			kind: 'payment-recorded',
			subject: id,
			data: { method: input.method, reference: input.reference, quantity: input.quantity }
		});
		await openPlaces({ ...work, scope }, order, null);
		return { orderId: id };
	}
});
