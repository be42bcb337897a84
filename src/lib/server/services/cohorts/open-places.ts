import { changeOrder, findCohort } from '../../data/queries/cohorts';
import { peopleWithRole } from '../../data/queries/schools';
import { accounts, places } from '../../data/models';
import { insertAll, select } from '../../data/rows';
import { acrossSchools, type SchoolScope } from '../../data/scope';
import type { Work, Written } from '../use-case';
import { inviteWaiting } from './invite-waiting';

type Pen = Pick<Work<unknown, SchoolScope>, 'house' | 'scope' | 'at' | 'newId'> & Written;
type Order = {
	id: string;
	cohortId: string;
	quantity: number;
	amountMinor: number;
	currency: string;
};

/**
 * Marks an order paid and opens exactly its places, in one transaction. The database refuses a
 * place without a paid order, and one number twice: a second settling cannot open more.
 */
export async function openPlaces(pen: Pen, order: Order, paymentId: string | null): Promise<void> {
	const { scope, at, newId } = pen;
	const settledAt = at.toISOString();
	await changeOrder(scope, order.id, { state: 'paid', paymentId, settledAt, fault: null });
	await insertAll(
		scope,
		places,
		Array.from({ length: order.quantity }, (_, index) => ({
			id: newId(),
			cohortId: order.cohortId,
			orderId: order.id,
			number: index + 1,
			openedAt: settledAt
		}))
	);
	await pen.record({
		kind: 'places-opened',
		subject: order.id,
		data: {
			cohort: order.cohortId,
			quantity: order.quantity,
			amountMinor: order.amountMinor,
			currency: order.currency
		}
	});
	const cohort = await findCohort(scope, order.cohortId);
	if (!cohort) throw new Error('an order belongs to a cohort');
	const invited = await inviteWaiting(pen, cohort);
	await tellOffice(pen, order, cohort.title, invited);
}

async function tellOffice(pen: Pen, order: Order, cohortTitle: string, invited: number) {
	const admins = await peopleWithRole(pen.scope, 'admin');
	const addressed = await select(acrossSchools(pen.scope), accounts, {
		id: admins.map((one) => one.accountId)
	});
	for (const { email, name } of addressed)
		await pen.mail({
			kind: 'payment-received',
			to: email,
			payload: {
				name,
				cohortTitle,
				quantity: order.quantity,
				amountMinor: order.amountMinor,
				currency: order.currency,
				invited
			}
		});
}
