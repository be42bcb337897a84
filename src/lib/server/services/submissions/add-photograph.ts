import { z } from 'zod';
import { Problem } from '$lib/domain/problem';
import { findSubmission, photographsOf } from '../../data/queries/submissions';
import { files, photographs } from '../../data/models';
import { insert, update } from '../../data/rows';
import { photographTypes } from '../../gateways/storage';
import type { Incoming } from '../../gateways/storage/storage';
import { writeCase } from '../use-case';
import { revisionsOfAttempt } from '../../data/queries/attempt-context';

/** A phone's largest photographs; what is larger is no photograph of a part. */
export const photographBytesAtMost = 25_000_000;
const photographsAtMost = 40;

/**
 * Takes a photograph in. It streams to the disk before any lock is held, its type read from its
 * content; the row commits only when the file is safe. Clean copies follow as a job.
 */
export const addPhotograph = writeCase({
	name: 'add-photograph',
	action: 'photograph:add',
	input: z.object({
		submissionId: z.string(),
		shotKey: z.string(),
		file: z.custom<Incoming>((value) => value !== null && typeof value === 'object', {
			message: 'Choose a photograph.'
		})
	}),
	async prepare({ house, input }) {
		const { storage } = house.gateways;
		return storage.receive(input.file, {
			bytesAtMost: photographBytesAtMost,
			mediaTypes: [...photographTypes]
		});
	},
	async subject({ scope, input }) {
		const attempt = await findSubmission(scope, input.submissionId);
		return attempt && { schoolId: scope.schoolId, ownerId: attempt.personId, attempt };
	},
	async run({ scope, house, subject: { attempt }, input, prepared, at, newId, record, enqueue }) {
		if (attempt.state !== 'open')
			throw new Problem(
				'closed',
				'This attempt is handed in. Photographs cannot be added any more.'
			);
		const { jobSheet } = await revisionsOfAttempt(scope, attempt);
		if (!jobSheet.shots.some((one) => one.key === input.shotKey))
			throw new Problem('input', 'Choose which shot of the job sheet this is.');
		if ((await photographsOf(scope, attempt.id)).length >= photographsAtMost)
			throw new Problem('conflict', 'There are {most} photographs. Take one out first.', {
				most: photographsAtMost
			});
		const kept = await house.gateways.storage.keep(prepared, scope.schoolId);
		const takenInAt = at.toISOString();
		const fileId = newId();
		await insert(scope, files, {
			id: fileId,
			sha256: kept.sha256,
			mediaType: kept.mediaType,
			bytes: kept.bytes,
			role: 'original',
			widthPx: null,
			heightPx: null,
			createdAt: takenInAt
		});
		const id = newId();
		await insert(scope, photographs, {
			id,
			submissionId: attempt.id,
			shotKey: input.shotKey,
			originalFileId: fileId,
			originalSha256: kept.sha256,
			smallFileId: null,
			mediumFileId: null,
			largeFileId: null,
			state: 'received',
			fault: null,
			tagFound: null,
			likeness: null,
			takenInAt,
			removedAt: null
		});
		await record({
			kind: 'photograph-added',
			subject: id,
			data: { submission: attempt.id, sha256: kept.sha256 }
		});
		await enqueue({ kind: 'copy-photograph', payload: { photographId: id } });
		return { photographId: id, sha256: kept.sha256 };
	}
});

/** Takes a photograph out of an open attempt. The original stays kept: what was sent in was sent in. */
export const removePhotograph = writeCase({
	name: 'remove-photograph',
	action: 'submission:work',
	input: z.object({ submissionId: z.string(), photographId: z.string() }),
	async subject({ scope, input }) {
		const attempt = await findSubmission(scope, input.submissionId);
		return attempt && { schoolId: scope.schoolId, ownerId: attempt.personId, attempt };
	},
	async run({ scope, subject: { attempt }, input, at, record }) {
		if (attempt.state !== 'open')
			throw new Problem('closed', 'This attempt is handed in. Nothing can be taken out any more.');
		if (attempt.body.findings.some((one) => one.photographId === input.photographId))
			throw new Problem(
				'conflict',
				'A finding is pinned in this photograph. Take the finding out first.'
			);
		const id = input.photographId;
		const removedAt = at.toISOString();
		const where = { id, submissionId: attempt.id, removedAt: null };
		if ((await update(scope, photographs, where, { removedAt })) !== 1)
			throw new Problem('absent', 'This photograph is not here any more.');
		await record({ kind: 'photograph-removed', subject: id, data: { submission: attempt.id } });
		return { removed: id };
	}
});
