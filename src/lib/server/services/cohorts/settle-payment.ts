import { z } from 'zod';
import { settle } from '$lib/domain/billing/settle';
import { changeOrder, findOrder } from '../../data/queries/cohorts';
import { paymentEvents } from '../../data/models';
import { find, insert, update } from '../../data/rows';
import { acrossSchools, within } from '../../data/scope';
import { writeCase } from '../use-case';
import { openPlaces } from './open-places';

/**
 * Takes a signed event from the till: stored once under its own id, however often it is sent.
 * The signature is checked before anything is written; what it says is only a hint.
 */
export const receivePaymentEvent = writeCase({
	name: 'receive-payment-event',
	action: 'system:run',
	where: 'common',
	input: z.object({ rawBody: z.string().max(512_000), signature: z.string() }),
	prepare: ({ house, input }) =>
		Promise.resolve(house.gateways.till.verifyWebhook(input.rawBody, input.signature)),
	subject: () => Promise.resolve({}),
	async run({ scope, prepared: event, at, enqueue }) {
		const known = await find(scope, paymentEvents, { id: event.id });
		if (known) return { received: true, again: true };
		await insert(scope, paymentEvents, {
			id: event.id,
			kind: event.kind,
			checkoutId: event.checkoutId,
			receivedAt: at.toISOString(),
			handledAt: null,
			outcome: null,
			hint: { kind: event.kind }
		});
		if (event.checkoutId)
			await enqueue({
				kind: 'settle-payment',
				payload: { checkoutId: event.checkoutId, eventId: event.id }
			});
		return { received: true, again: false };
	}
});

/** Asks the till what is true now and does what follows from it. Safe to run any number of times. */
export const settlePayment = writeCase({
	name: 'settle-payment',
	action: 'system:run',
	where: 'common',
	input: z.object({ checkoutId: z.string(), eventId: z.string().optional() }),
	prepare: ({ house, input }) => house.gateways.till.readCheckout(input.checkoutId),
	subject: () => Promise.resolve({}),
	async run({ prepared: truth, input, scope: everywhere, ...work }) {
		const noted = async (outcome: string) => {
			if (input.eventId)
				await update(
					acrossSchools(everywhere),
					paymentEvents,
					{ id: input.eventId },
					{ handledAt: work.at.toISOString(), outcome }
				);
			return { outcome };
		};
		if (!truth.schoolId || !truth.orderId) return noted('It names no order of this house.');
		const scope = within(everywhere, truth.schoolId);
		const order = await findOrder(scope, truth.orderId);
		if (!order) return noted('It names no order of this house.');
		const live = work.house.gateways.till.live;
		const { amountMinor, currency } = order;
		const next = settle({ ...order, money: { amountMinor, currency } }, truth, live);
		const pen = {
			...work,
			scope,
			record: (line: Parameters<typeof work.record>[0]) =>
				work.record({ ...line, schoolId: scope.schoolId }),
			mail: (mail: Parameters<typeof work.mail>[0]) =>
				work.mail({ ...mail, schoolId: scope.schoolId })
		};
		if (next.to === 'paid') await openPlaces(pen, order, next.paymentId);
		else if (next.to === 'refused') await changeOrder(scope, order.id, { fault: next.fault });
		else if (next.to === 'expired' && order.state !== 'expired') {
			await changeOrder(scope, order.id, { state: 'expired', fault: null });
			await pen.record({ kind: 'order-expired', subject: order.id, data: {} });
		}
		return noted(next.to === 'unchanged' ? next.because : next.to);
	}
});
