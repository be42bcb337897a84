import { jobs } from '../models';
import { find, insert, select, update } from '../rows';
import { acrossSchools, type Scope } from '../scope';

export type NewJob = {
	kind: string;
	payload: Record<string, unknown>;
	schoolId?: string;
	runAt?: Date;
	/** A key of its own for work that must be queued once, such as one day's ledger head. */
	id?: string;
};

export async function enqueueJob(scope: Scope, job: NewJob, newId: string, at: Date) {
	const id = job.id ?? newId;
	if (job.id && (await find(acrossSchools(scope), jobs, { id }))) return;
	await insert(acrossSchools(scope), jobs, {
		id,
		schoolId: job.schoolId ?? (scope.kind === 'school' ? scope.schoolId : null),
		kind: job.kind,
		payload: job.payload,
		state: 'waiting',
		runAt: (job.runAt ?? at).toISOString(),
		attempts: 0,
		startedAt: null,
		endedAt: null,
		fault: null
	});
}

/** Somebody waits for these: they go before work that only has to be done some time. */
const waitedFor = ['send-mail', 'settle-payment'];

/** Takes the job that has waited longest, or none. One atomic change: two workers never share one. */
export async function takeJob(scope: Scope, at: Date) {
	const waiting = { state: 'waiting' as const, runAt: { atMost: at.toISOString() } };
	const longest = { order: [['runAt', 'asc']] as [['runAt', 'asc']] };
	const due =
		(await find(acrossSchools(scope), jobs, { ...waiting, kind: waitedFor }, longest)) ??
		(await find(acrossSchools(scope), jobs, waiting, longest));
	if (!due) return undefined;
	const taken = await update(
		acrossSchools(scope),
		jobs,
		{ id: due.id, state: 'waiting' },
		{ state: 'running', startedAt: at.toISOString(), attempts: due.attempts + 1 }
	);
	return taken === 1 ? { ...due, attempts: due.attempts + 1 } : undefined;
}

export function endJob(scope: Scope, id: string, at: Date) {
	return update(
		acrossSchools(scope),
		jobs,
		{ id },
		{ state: 'done', endedAt: at.toISOString(), fault: null }
	);
}

export function postponeJob(scope: Scope, id: string, runAt: Date, fault: string) {
	return update(
		acrossSchools(scope),
		jobs,
		{ id },
		{ state: 'waiting', runAt: runAt.toISOString(), fault }
	);
}

export function failJob(scope: Scope, id: string, at: Date, fault: string) {
	return update(
		acrossSchools(scope),
		jobs,
		{ id },
		{ state: 'failed', endedAt: at.toISOString(), fault }
	);
}

/** Jobs that were running when the process died: they run again, each handler can bear that. */
export function interruptedJobs(scope: Scope) {
	return select(acrossSchools(scope), jobs, { state: 'running' });
}
