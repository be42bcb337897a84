import { ulid } from '$lib/domain/ids';
import { enqueueJob } from '../data/queries/jobs';
import { commonScope } from '../data/scope';
import { inTransaction } from '../data/transaction';
import type { House } from '../services/house';

const queuedToday = new WeakMap<House, string>();

/**
 * Queues what is due once a day. The job's id is made of its name and the day, so that two
 * workers, or one that restarts, collide on the key instead of doing it twice.
 */
export async function queueDueWork(house: House): Promise<void> {
	const at = house.now();
	const day = at.toISOString().slice(0, 10);
	if (queuedToday.get(house) === day) return;
	await inTransaction(house.database, (transaction) =>
		enqueueJob(
			commonScope(house.database, transaction),
			{ kind: 'sign-ledger-heads', payload: { day }, id: `sign-ledger-heads:${day}` },
			ulid(at.getTime(), house.chance(10)),
			at
		)
	);
	queuedToday.set(house, day);
}
