import { z } from 'zod';
import { findFile, ownerOfFile } from '../../data/queries/submissions';
import type { SchoolScope } from '../../data/scope';
import { storageKey } from '../../gateways/storage';
import { readCase } from '../use-case';

const input = z.object({ fileId: z.string() });

async function fileHere(scope: SchoolScope, fileId: string) {
	const [file, owner] = await Promise.all([findFile(scope, fileId), ownerOfFile(scope, fileId)]);
	return file && owner ? { file, owner } : undefined;
}

/** A clean copy of a photograph, for those who may look at the work. */
export const readPhotographCopy = readCase({
	name: 'read-photograph-copy',
	action: 'photograph:see',
	input,
	async subject({ scope, input }) {
		const found = await fileHere(scope, input.fileId);
		if (!found || found.file.role !== 'copy') return undefined;
		return { schoolId: scope.schoolId, ownerId: found.owner.ownerId, file: found.file };
	},
	run: ({ scope, subject: { file } }) =>
		Promise.resolve({
			key: storageKey(scope.schoolId, file.sha256),
			mediaType: file.mediaType,
			bytes: file.bytes,
			sha256: file.sha256
		})
});

/** The photograph exactly as it was sent in, place data and all: for a verifier alone. */
export const readOriginal = readCase({
	name: 'read-original',
	action: 'original:see',
	input,
	async subject({ scope, input }) {
		const found = await fileHere(scope, input.fileId);
		if (found?.file.role !== 'original') return undefined;
		return { schoolId: scope.schoolId, file: found.file };
	},
	run: ({ scope, subject: { file } }) =>
		Promise.resolve({
			key: storageKey(scope.schoolId, file.sha256),
			mediaType: file.mediaType,
			bytes: file.bytes,
			sha256: file.sha256
		})
});
