import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ledgerEntries, mails, orders, paymentEvents } from '$lib/server/data/models';
import { count, find, select } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { buyPlaces, recordPayment } from '$lib/server/services/cohorts/buy-places';
import { applyCohortRoster } from '$lib/server/services/cohorts/plan-roster';
import { receivePaymentEvent } from '$lib/server/services/cohorts/settle-payment';
import { POST } from '../../../src/routes/api/v1/stripe/webhook/+server';
import { makeEvent } from '../../support/event';
import { asSystem } from '../../support/house';
import type { SignedEvent, TillSession } from '../../support/till';
import { openOffice, type Office } from './office';

let office: Office;
beforeEach(async () => {
	office = await openOffice();
});
afterEach(() => office.close());

const buy = async (quantity: number, key?: string) =>
	buyPlaces(await office.admin.caller(key), { cohortId: office.cohortId, quantity });
const receive = (event: SignedEvent) => receivePaymentEvent(asSystem(office.house), event);
const session = (index = 0): TillSession => {
	const found = office.till.sessions[index];
	if (!found) throw new Error('the till has no such checkout');
	return found;
};
const paid = { status: 'complete', payment_status: 'paid' } as const;
/** The payer pays, and the till says so once. */
async function payAt(index = 0, eventId = `evt_${index}`) {
	Object.assign(session(index), paid, { payment_intent: { id: 'pi_1', last_payment_error: null } });
	await receive(office.till.event(session(index), eventId));
	await office.house.work();
}
const outcomes = async () =>
	(await select(office.house.look, paymentEvents)).map((one) => one.outcome);
const opened = () => count(office.house.look, ledgerEntries, { kind: 'places-opened' });

describe('places by card', () => {
	it('open when the till says that they are paid, not before', async () => {
		const { url } = await buy(3);
		expect(url).toBe(session().url);
		expect(await office.orders()).toEqual(['open']);
		expect(await office.places()).toBe(0);
		await payAt();
		expect(await office.orders()).toEqual(['paid']);
		expect(await office.places()).toBe(3);
		expect(await outcomes()).toEqual(['paid']);
	});

	it('invite who waits, and tell the office', async () => {
		const list = 'Anna Strand,anna@quay.example\nPer Dalby,per@quay.example';
		const asked = { cohortId: office.cohortId, list };
		await applyCohortRoster(await office.admin.caller(), asked);
		await buy(1);
		await payAt();
		expect(await office.roster()).toEqual([
			'anna@quay.example invited',
			'per@quay.example waiting'
		]);
		const letter = { kind: 'payment-received', recipient: office.admin.email };
		expect(await count(office.house.look, mails, letter)).toBe(1);
	});

	it('ask the till under the order’s own id, so that a second press makes one checkout', async () => {
		const key = '01ARZ3NDEKTSV4RRFFQ69G5FAV';
		const first = await buy(2, key);
		expect(await buy(2, key)).toEqual(first);
		const rows = await select(office.house.look, orders);
		expect(rows).toHaveLength(1);
		expect(office.till.keys).toEqual([rows[0]?.id, rows[0]?.id]);
		expect(office.till.sessions).toHaveLength(1);
	});

	it('that the till refuses leave an order that says so', async () => {
		office.till.refuse(true);
		await expect(buy(2)).rejects.toMatchObject({ code: 'refused' });
		expect(await office.orders()).toEqual(['cancelled']);
		expect(await office.places()).toBe(0);
	});

	it('are bought by the office alone', async () => {
		const asked = { cohortId: office.cohortId, quantity: 1 };
		const elsewhere = await office.house.addPerson(office.otherSchool, 'Odd Vik', ['admin']);
		for (const one of [office.instructor, elsewhere])
			await expect(buyPlaces(await one.caller(), asked)).rejects.toMatchObject({ code: 'absent' });
		expect(office.till.sessions).toEqual([]);
	});
});

describe('an event from the till', () => {
	it('counts once, however often it comes, and in however many guises', async () => {
		await buy(2);
		await payAt(0, 'evt_1');
		expect(await receive(office.till.event(session(), 'evt_1'))).toMatchObject({ again: true });
		await receive(
			office.till.event(session(), 'evt_2', 'checkout.session.async_payment_succeeded')
		);
		await office.house.work();
		expect(await office.places()).toBe(2);
		expect(await opened()).toBe(1);
		expect(await outcomes()).toEqual(['paid', 'It was paid before.']);
	});

	it('counts right out of order: an old “expired” does not take a payment back', async () => {
		await buy(2);
		const expired = office.till.event({ ...session(), status: 'expired' }, 'evt_old', 'x.expired');
		await payAt();
		await receive(expired);
		await office.house.work();
		expect(await office.orders()).toEqual(['paid']);
		expect(await office.places()).toBe(2);
	});

	it('is only a hint: “completed” opens nothing while the till says unpaid', async () => {
		await buy(2);
		const claims = { ...session(), ...paid };
		await receive(office.till.event(claims, 'evt_1'));
		await office.house.work();
		expect(await office.orders()).toEqual(['open']);
		expect(await office.places()).toBe(0);
		expect(await outcomes()).toEqual(['It is not paid yet.']);
	});

	it('that arrives before the checkout’s address was kept is settled all the same', async () => {
		await buy(2);
		const [order] = await select(office.house.look, orders);
		await office.house.database.sequelize.query(
			`UPDATE orders SET state = 'intended', checkoutId = NULL WHERE id = '${order?.id}'`
		);
		await payAt();
		expect(await office.orders()).toEqual(['paid']);
	});

	it.each([
		['another amount', { amount_total: 1 }, /amount or the currency/],
		['another currency', { currency: 'nok' }, /amount or the currency/],
		['real money in a test house', { livemode: true }, /another mode/]
	])('with %s opens nothing', async (_what, change, because) => {
		await buy(2);
		Object.assign(session(), change);
		await payAt();
		expect(await office.places()).toBe(0);
		expect(await office.orders()).toEqual(['open']);
		expect((await outcomes())[0]).toMatch(because);
	});

	it('that names another school’s order opens nothing, here or there', async () => {
		await buy(2);
		const { orderId = '' } = session().metadata;
		session().metadata = { orderId, schoolId: office.otherSchool };
		await payAt();
		expect(await office.places()).toBe(0);
		expect(await outcomes()).toEqual(['It names no order of this house.']);
	});

	it('of a checkout that is not this order’s opens nothing', async () => {
		await buy(2);
		await buy(2);
		session(1).metadata = { ...session(0).metadata };
		await payAt(1);
		expect(await office.places()).toBe(0);
		expect((await outcomes())[0]).toBe('It is another checkout.');
	});

	it('of a card that was refused says so on the order; it can still be paid', async () => {
		await buy(1);
		session().payment_intent = { id: 'pi_1', last_payment_error: { message: 'Card declined.' } };
		await receive(office.till.event(session(), 'evt_1', 'checkout.session.x'));
		await office.house.work();
		const inSchool = within(office.house.look, office.school);
		expect(await find(inSchool, orders, {})).toMatchObject({
			state: 'open',
			fault: 'Card declined.'
		});
		await payAt(0, 'evt_2');
		expect(await find(inSchool, orders, {})).toMatchObject({ state: 'paid', fault: null });
	});
});

describe('the webhook', () => {
	const post = async ({ rawBody, signature }: SignedEvent) => {
		const headers = { 'content-type': 'application/json', 'stripe-signature': signature };
		const asked = { method: 'POST', headers, body: rawBody };
		return POST((await makeEvent(office.house, '/api/v1/stripe/webhook', asked)) as never);
	};

	it('takes what is signed, without an Origin, and answers the same the second time', async () => {
		await buy(1);
		const event = office.till.event(session(), 'evt_1');
		expect([(await post(event)).status, (await post(event)).status]).toEqual([200, 200]);
		expect(await count(office.house.look, paymentEvents)).toBe(1);
	});

	it('refuses what is not, and keeps nothing of it', async () => {
		await buy(1);
		const { rawBody, signature } = office.till.event(session(), 'evt_1');
		const forged = { rawBody: rawBody.replace('evt_1', 'evt_2'), signature };
		for (const event of [forged, { rawBody, signature: '' }])
			expect((await post(event)).status).toBe(400);
		expect(await count(office.house.look, paymentEvents)).toBe(0);
	});
});

describe('a payment made another way', () => {
	it('opens exactly its places, under the name of who recorded it', async () => {
		const asked = { cohortId: office.cohortId, quantity: 4, method: 'purchase-order' };
		const reference = 'PO-7731';
		await recordPayment(await office.admin.caller(), { ...asked, reference });
		expect(await office.places()).toBe(4);
		const line = await find(office.house.look, ledgerEntries, { kind: 'payment-recorded' });
		expect(line).toMatchObject({ actorId: office.admin.personId, data: { reference } });
	});

	it('needs its number', async () => {
		const asked = {
			cohortId: office.cohortId,
			quantity: 4,
			method: 'bank-transfer',
			reference: ' '
		};
		await expect(recordPayment(await office.admin.caller(), asked)).rejects.toMatchObject({
			code: 'input'
		});
		expect(await office.places()).toBe(0);
	});
});
