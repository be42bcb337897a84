import { Problem } from '$lib/domain/problem';
import { retryAfterMs } from '$lib/domain/jobs/retry';
import { endJob, failJob, interruptedJobs, postponeJob, takeJob } from '../data/queries/jobs';
import { commonScope } from '../data/scope';
import { inTransaction } from '../data/transaction';
import type { House } from '../services/house';
import { handlers } from './handlers';
import { queueDueWork } from './schedule';

export type Worker = { stop: () => Promise<void>; nudge: () => void };

const idleMs = 500;

/**
 * Does the queued jobs one after another, each at least once. It runs inside the web process by
 * default; a worker of its own is the same loop started by another entry.
 */
export function startWorker(house: House): Worker {
	let stopping = false;
	let wake: () => void = () => undefined;
	const pause = () =>
		new Promise<void>((resolve) => {
			const timer = setTimeout(resolve, idleMs);
			wake = () => {
				clearTimeout(timer);
				resolve();
			};
		});

	const done = (async () => {
		await takeUpInterrupted(house);
		while (!stopping) {
			try {
				await queueDueWork(house);
				if (!(await workOnce(house))) await pause();
			} catch (error) {
				house.log.error({ err: error }, 'worker');
				await pause();
			}
		}
	})();
	return {
		nudge: () => wake(),
		async stop() {
			stopping = true;
			wake();
			await done;
		}
	};
}

/** Does one due job. @returns whether there was one */
export async function workOnce(house: House): Promise<boolean> {
	const { database } = house;
	const job = await inTransaction(database, (transaction) =>
		takeJob(commonScope(database, transaction), house.now())
	);
	if (!job) return false;
	const settle = (change: (scope: ReturnType<typeof commonScope>) => Promise<unknown>) =>
		inTransaction(database, (transaction) => change(commonScope(database, transaction)));
	try {
		const handler = handlers[job.kind];
		if (!handler) throw new Error(`no handler for ${job.kind}`);
		await handler(house, job.payload, job.attempts);
		await settle((scope) => endJob(scope, job.id, house.now()));
	} catch (error) {
		const waitMs = retryAfterMs(job.attempts);
		const fault = error instanceof Problem ? error.words : faultOf(error);
		if (!(error instanceof Problem)) house.log.error({ err: error, job: job.kind }, 'job');
		await settle((scope) =>
			waitMs === undefined
				? failJob(scope, job.id, house.now(), fault)
				: postponeJob(scope, job.id, new Date(house.now().getTime() + waitMs), fault)
		);
	}
	return true;
}

/** What a job page may show of an unexpected error: its kind, never what it carried. */
function faultOf(error: unknown): string {
	return error instanceof Error ? error.name : 'unknown fault';
}

async function takeUpInterrupted(house: House): Promise<void> {
	const { database } = house;
	await inTransaction(database, async (transaction) => {
		const scope = commonScope(database, transaction);
		for (const job of await interruptedJobs(scope))
			await postponeJob(
				scope,
				job.id,
				house.now(),
				'The server stopped while this was being done.'
			);
	});
}
