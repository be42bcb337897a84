import { openOrders } from '../data/queries/cohorts';
import { enqueueJob, type NewJob } from '../data/queries/jobs';
import { commonScope } from '../data/scope';
import { inTransaction } from '../data/transaction';
import type { House } from '../services/house';

const minuteMs = 60_000;
const queuedMinute = new WeakMap<House, string>();

/**
 * Queues what is due by the clock. A job's id is made of its name and its slot, so that two
 * workers, or one that restarts, collide on the key instead of doing it twice.
 */
export async function queueDueWork(house: House): Promise<void> {
	const at = house.now();
	const minute = new Date(Math.floor(at.getTime() / minuteMs) * minuteMs)
		.toISOString()
		.slice(0, 16);
	if (queuedMinute.get(house) === minute) return;
	await inTransaction(house.database, async (transaction) => {
		const scope = commonScope(house.database, transaction);
		for (const job of await dueAt(scope, minute)) await enqueueJob(scope, job, job.id, at);
	});
	queuedMinute.set(house, minute);
}

type Slot = NewJob & { id: string };

async function dueAt(scope: ReturnType<typeof commonScope>, minute: string): Promise<Slot[]> {
	const [day, quarter] = [minute.slice(0, 10), `${minute.slice(0, 13)}:${minute.slice(14, 15)}`];
	const slots: Slot[] = [
		{ kind: 'sign-ledger-heads', payload: { day }, id: `sign-ledger-heads:${day}` },
		{ kind: 'forget-expired', payload: {}, id: `forget-expired:${day}` },
		{ kind: 'sweep-files', payload: {}, id: `sweep-files:${day}` },
		{ kind: 'end-overdue-sittings', payload: {}, id: `end-overdue-sittings:${minute}` }
	];
	// A webhook can be lost: a checkout that no word came of is asked after every ten minutes.
	for (const order of await openOrders(scope))
		if (order.checkoutId)
			slots.push({
				kind: 'settle-payment',
				payload: { checkoutId: order.checkoutId },
				id: `settle-payment:${order.id}:${quarter}`
			});
	return slots;
}
