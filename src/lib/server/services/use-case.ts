import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import type { z } from 'zod';
import { may, mightEver } from '$lib/domain/access/policy';
import type { Action, Subject } from '$lib/domain/access/subjects';
import { membershipIn, type Actor } from '$lib/domain/actor';
import { ulid } from '$lib/domain/ids';
import { mailKindNamed } from '$lib/domain/mail/registry';
import { inputProblem, Problem } from '$lib/domain/problem';
import { appendToLedger, type LedgerLine } from '../data/queries/ledger';
import { enqueueJob, type NewJob } from '../data/queries/jobs';
import { enqueueMail, type NewMail } from '../data/queries/mails';
import { findRequest, keepAnswer } from '../data/queries/request-keys';
import { commonScope, schoolScope, type Scope, type SchoolScope } from '../data/scope';
import { inTransaction } from '../data/transaction';
import type { House } from './house';

/** Who asks, where, and under which key (a ULID made by the client, for writes). */
export type Caller<School extends string | undefined = string | undefined> = {
	house: House;
	actor: Actor;
	schoolId: School;
	requestKey?: string;
};

/** What a use case is given. `me` is the asker's person id in the school; '' where there is none. */
export type Work<Input, Where extends Scope> = {
	house: House;
	scope: Where;
	actor: Actor;
	me: string;
	input: Input;
	at: Date;
	newId: () => string;
};
export type Written = {
	/** A line in the school's ledger; `schoolId` only where the use case is common to all schools. */
	record: (line: LedgerLine & { schoolId?: string }) => Promise<void>;
	enqueue: (job: NewJob) => Promise<void>;
	mail: (mail: NewMail) => Promise<void>;
};

type Spec<A extends Action, Z extends z.ZodType, Where extends Scope, P, S, Out> = {
	name: string;
	action: A;
	/** `common` where no school is named in the address: accounts, invitations, checking a certificate. */
	where: Where['kind'];
	input: Z;
	/** Slow work outside any lock: hashing, files, other services. Runs after the cheap check. */
	prepare?: (work: Omit<Work<z.infer<Z>, Where>, 'scope'>) => Promise<P>;
	/** Loads what the right is decided on. Nothing found looks the same as not allowed. */
	subject: (
		work: Work<z.infer<Z>, Where> & { prepared: P }
	) => Promise<(Subject<A> & S) | undefined>;
	run: (
		work: Work<z.infer<Z>, Where> & { prepared: P; subject: Subject<A> & S } & Written
	) => Promise<Out>;
};

export type UseCase<Input, Out> = {
	readonly name: string;
	readonly action: Action;
	readonly writes: boolean;
	readonly input: z.ZodType<Input>;
	(caller: Caller, input: unknown): Promise<Out>;
};

type ScopeOf<K extends Scope['kind']> = Extract<Scope, { kind: K }>;
type Given<A extends Action, Z extends z.ZodType, K extends Scope['kind'], P, S, Out> = Omit<
	Spec<A, Z, ScopeOf<K>, P, S, Out>,
	'where'
> & { where?: K };

/** A use case that changes something: queued, in one transaction with its ledger lines and jobs. */
export function writeCase<
	A extends Action,
	Z extends z.ZodType,
	Out,
	S = unknown,
	P = undefined,
	K extends Scope['kind'] = 'school'
>(given: Given<A, Z, K, P, S, Out>): UseCase<z.infer<Z>, Out> {
	const spec = complete<A, Z, K, P, S, Out>(given);
	return useCase(spec, true, async (caller, input, prepared) => {
		const requestHash = hashRequest(spec.name, caller, input);
		return inTransaction(caller.house.database, async (transaction) => {
			const scope = scopeFor<K>(spec.where as K, caller, transaction);
			const kept = await earlierAnswer(scope, caller, spec.name, requestHash);
			if (kept) return kept.answer as Out;
			const work = { ...workFor(caller, input), scope, prepared };
			const subject = await allowed(spec, caller, work);
			const written = pen(caller, scope, work.at, work.newId);
			const answer = await spec.run({ ...work, subject, ...written });
			if (caller.requestKey)
				await keepAnswer(scope, {
					owner: ownerOf(caller.actor),
					requestKey: caller.requestKey,
					useCase: spec.name,
					requestHash,
					answer: answer ?? null,
					at: work.at.toISOString()
				});
			return answer;
		});
	});
}

/** A use case that only looks: the same checks, without queue and transaction. */
export function readCase<
	A extends Action,
	Z extends z.ZodType,
	Out,
	S = unknown,
	P = undefined,
	K extends Scope['kind'] = 'school'
>(given: Given<A, Z, K, P, S, Out>): UseCase<z.infer<Z>, Out> {
	const spec = complete<A, Z, K, P, S, Out>(given);
	return useCase(spec, false, async (caller, input, prepared) => {
		const scope = scopeFor<K>(spec.where as K, caller, null);
		const work = { ...workFor(caller, input), scope, prepared };
		const subject = await allowed(spec, caller, work);
		return spec.run({ ...work, subject, ...unwritten });
	});
}

function complete<A extends Action, Z extends z.ZodType, K extends Scope['kind'], P, S, Out>(
	given: Given<A, Z, K, P, S, Out>
): Spec<A, Z, ScopeOf<K>, P, S, Out> {
	return { where: 'school' as ScopeOf<K>['kind'], ...given } as Spec<A, Z, ScopeOf<K>, P, S, Out>;
}

function useCase<A extends Action, Z extends z.ZodType, Where extends Scope, P, S, Out>(
	spec: Spec<A, Z, Where, P, S, Out>,
	writes: boolean,
	go: (caller: Caller, input: z.infer<Z>, prepared: P) => Promise<Out>
): UseCase<z.infer<Z>, Out> {
	const called = async (caller: Caller, raw: unknown): Promise<Out> => {
		const input = parse(spec.input, raw);
		if (!mightEver(caller.actor, spec.action, caller.schoolId)) throw notFor(caller.actor);
		const prepared = (await spec.prepare?.(workFor(caller, input))) as P;
		return go(caller, input, prepared);
	};
	const facts = { action: spec.action, writes, input: spec.input as z.ZodType<z.infer<Z>> };
	Object.defineProperty(called, 'name', { value: spec.name });
	return Object.assign(called, facts) as UseCase<z.infer<Z>, Out>;
}

function parse<Z extends z.ZodType>(schema: Z, raw: unknown): z.infer<Z> {
	const parsed = schema.safeParse(raw);
	if (parsed.success) return parsed.data;
	const fields: Record<string, string[]> = {};
	for (const issue of parsed.error.issues)
		(fields[issue.path.join('.') || 'form'] ??= []).push(issue.message);
	throw inputProblem(fields);
}

async function allowed<A extends Action, Z extends z.ZodType, Where extends Scope, P, S, Out>(
	spec: Spec<A, Z, Where, P, S, Out>,
	caller: Caller,
	work: Work<z.infer<Z>, Where> & { prepared: P }
): Promise<Subject<A> & S> {
	const subject = await spec.subject(work);
	if (subject === undefined || !may(caller.actor, spec.action, subject)) throw notFor(caller.actor);
	return subject;
}

/** Absent and forbidden are one answer, so that nobody learns what exists from being refused. */
function notFor(actor: Actor): Problem {
	return actor.kind === 'anyone'
		? new Problem('signed-out', 'Sign in to go on.')
		: new Problem('absent', 'There is nothing here for you at this address.');
}

function scopeFor<K extends Scope['kind']>(
	where: K,
	caller: Caller,
	transaction: Scope['transaction']
): ScopeOf<K> {
	const { database } = caller.house;
	if (where === 'common') return commonScope(database, transaction) as ScopeOf<K>;
	if (caller.schoolId === undefined) throw new Error('this use case needs a school');
	return schoolScope(database, caller.schoolId, transaction) as ScopeOf<K>;
}

function workFor<I>(caller: Caller, input: I) {
	const { house, actor } = caller;
	const me = caller.schoolId === undefined ? undefined : membershipIn(actor, caller.schoolId);
	return {
		house,
		actor,
		input,
		me: me?.personId ?? '',
		at: house.now(),
		newId: () => ulid(house.now().getTime(), house.chance(10))
	};
}

async function earlierAnswer(scope: Scope, caller: Caller, useCase: string, requestHash: string) {
	const { requestKey } = caller;
	if (!requestKey) return undefined;
	const kept = await findRequest(scope, { owner: ownerOf(caller.actor), requestKey });
	if (kept && (kept.useCase !== useCase || kept.requestHash !== requestHash))
		throw new Problem('conflict', 'This request was sent before with other content. Send it anew.');
	return kept;
}

function hashRequest(name: string, caller: Caller, input: unknown): string {
	const text = canonicalize([
		name,
		caller.schoolId ?? null,
		JSON.parse(JSON.stringify(input ?? null))
	]);
	return createHash('sha256')
		.update(text ?? '')
		.digest('hex');
}

function ownerOf(actor: Actor): string {
	if (actor.kind === 'account') return actor.accountId;
	return actor.kind === 'script' ? actor.tokenId : actor.kind;
}

/** How the ledger names who did it: a person by their pseudonymous id in the school. */
function ledgerName(actor: Actor, schoolId: string): string {
	if (actor.kind === 'account') return membershipIn(actor, schoolId)?.personId ?? 'visitor';
	return actor.kind === 'script' ? `script:${actor.tokenId}` : actor.kind;
}

function pen(caller: Caller, scope: Scope, at: Date, newId: () => string): Written {
	const schoolOf = (named?: string) => {
		const schoolId = scope.kind === 'school' ? scope.schoolId : named;
		if (schoolId === undefined) throw new Error('name the school whose ledger this is');
		return schoolId;
	};
	return {
		async record({ schoolId: named, ...line }) {
			const schoolId = schoolOf(named);
			const where: SchoolScope = schoolScope(scope.database, schoolId, scope.transaction);
			const actorId = ledgerName(caller.actor, schoolId);
			await appendToLedger(where, { ...line, actorId, at: at.toISOString() });
		},
		enqueue: (job) => enqueueJob(scope, job, newId(), at),
		mail(mail) {
			// A letter that could not be rendered must fail here, not in the worker an hour later.
			const { kind, payload, links } = mail;
			mailKindNamed(kind).payload.parse({ ...payload, ...links });
			return enqueueMail(scope, caller.house.gateways.signing, mail, newId, at);
		}
	};
}

const unwritten: Written = {
	record: () => Promise.reject(new Error('a read writes nothing')),
	enqueue: () => Promise.reject(new Error('a read writes nothing')),
	mail: () => Promise.reject(new Error('a read writes nothing'))
};
