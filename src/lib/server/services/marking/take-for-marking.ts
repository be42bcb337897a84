import { z } from 'zod';
import { holderNow, leaseUntil } from '$lib/domain/marking/lease';
import { Problem } from '$lib/domain/problem';
import { attemptFace } from '../../data/queries/attempt-face';
import { findPerson, peopleWithRole } from '../../data/queries/schools';
import {
	attemptsOf,
	findSubmission,
	leaseOf,
	sharedPhotographs
} from '../../data/queries/submissions';
import { markingLeases } from '../../data/models';
import { insert, remove } from '../../data/rows';
import type { SchoolScope } from '../../data/scope';
import { readCase, writeCase } from '../use-case';

const input = z.object({ submissionId: z.string() });

async function attemptHere({
	scope,
	input
}: {
	scope: SchoolScope;
	input: { submissionId: string };
}) {
	const attempt = await findSubmission(scope, input.submissionId);
	return attempt && attempt.state !== 'open'
		? { schoolId: scope.schoolId, ownerId: attempt.personId, attempt }
		: undefined;
}

/**
 * Takes a submission to mark it. One row a submission is the lease: while it runs nobody else
 * gets the work, and whoever asks is told who has it and until when.
 */
export const takeForMarking = writeCase({
	name: 'take-for-marking',
	action: 'marking:take',
	input,
	subject: attemptHere,
	async run({ scope, subject: { attempt }, me, at, record }) {
		if (attempt.state !== 'handed-in')
			throw new Problem('closed', 'This submission is marked already.');
		const lease = await leaseOf(scope, attempt.id);
		const holder = holderNow(lease, at);
		if (lease && holder !== null && holder !== me) {
			const marker = await findPerson(scope, holder);
			throw new Problem('conflict', 'This work is with {marker} until {until}.', {
				marker: marker?.name ?? 'another instructor',
				until: new Date(lease.untilAt)
			});
		}
		const untilAt = leaseUntil(at);
		await remove(scope, markingLeases, { submissionId: attempt.id });
		await insert(scope, markingLeases, { submissionId: attempt.id, markerId: me, untilAt });
		if (holder !== me)
			await record({ kind: 'marking-taken', subject: attempt.id, data: { untilAt } });
		return { untilAt };
	}
});

export const putBack = writeCase({
	name: 'put-back',
	action: 'marking:take',
	input,
	subject: attemptHere,
	async run({ scope, subject: { attempt }, me, record }) {
		const gone = await remove(scope, markingLeases, { submissionId: attempt.id, markerId: me });
		if (gone > 0) await record({ kind: 'marking-put-back', subject: attempt.id, data: {} });
		return { putBack: gone > 0 };
	}
});

/** The marking view: the work, what the machine noticed in it, and the attempt before. */
export const readForMarking = readCase({
	name: 'read-for-marking',
	action: 'marking:take',
	input,
	subject: attemptHere,
	async run({ scope, subject: { attempt }, me, at }) {
		const [face, lease, shared, attempts, student, staff] = await Promise.all([
			attemptFace(scope, attempt),
			leaseOf(scope, attempt.id),
			sharedPhotographs(scope, attempt.id),
			attemptsOf(scope, attempt.enrolmentId, attempt.stepKey),
			findPerson(scope, attempt.personId),
			peopleWithRole(scope, 'instructor')
		]);
		const holder = holderNow(lease, at);
		const holderPerson = holder === null ? undefined : await findPerson(scope, holder);
		const earlier = attempts.filter((one) => one.attempt < attempt.attempt).at(-1);
		return {
			...face,
			studentName: student?.name ?? '',
			withYou: holder === me,
			withAnother: holder !== null && holder !== me ? (holderPerson?.name ?? 'another') : null,
			leaseUntilAt: holder === null ? null : (lease?.untilAt ?? null),
			shared,
			/** Who may be named as having seen the work at the bench. */
			witnesses: staff.map(({ id, name }) => ({ id, name })),
			earlier: earlier ? await attemptFace(scope, earlier) : null
		};
	}
});
