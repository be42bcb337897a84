import { z } from 'zod';
import { tagFound } from '$lib/domain/job-sheets/evidence-tag';
import { Problem } from '$lib/domain/problem';
import { findFile, findPhotograph, findSubmission } from '../../data/queries/submissions';
import { files, photographs } from '../../data/models';
import { find, insert, update } from '../../data/rows';
import { acrossSchools, commonScope, within, type SchoolScope } from '../../data/scope';
import { storageKey } from '../../gateways/storage';
import type { House } from '../house';
import { writeCase } from '../use-case';

async function findAnywhere(house: House, photographId: string) {
	const scope = commonScope(house.database, null);
	const row = await find(acrossSchools(scope), photographs, { id: photographId });
	if (!row) return undefined;
	const school = within(scope, row.schoolId);
	const original = await findFile(school, row.originalFileId);
	return original ? { row, original } : undefined;
}

/**
 * Makes the clean copies of a photograph in the image child, outside any lock: turned upright,
 * re-encoded, place data gone. Reads the evidence tag on the way. Done twice it changes nothing.
 */
export const copyPhotograph = writeCase({
	name: 'copy-photograph',
	action: 'system:run',
	where: 'common',
	input: z.object({ photographId: z.string() }),
	async prepare({ house, input }) {
		const found = await findAnywhere(house, input.photographId);
		if (found?.row.state !== 'received') return undefined;
		const { storage, images } = house.gateways;
		const { schoolId } = found.row;
		try {
			const answer = await images.cleanCopies({
				source: storage.pathOf(storageKey(schoolId, found.original.sha256)),
				folder: await storage.workFolder(),
				mediaType: found.original.mediaType
			});
			const kept = await Promise.all(
				answer.copies.map(async (copy) => ({
					...copy,
					...(await storage.keepMade(copy.path, schoolId, copy.mediaType))
				}))
			);
			return { schoolId, answer, kept };
		} catch (error) {
			if (error instanceof Problem && error.code !== 'unavailable')
				return { schoolId, fault: error.words };
			throw error;
		}
	},
	subject: () => Promise.resolve({}),
	async run({ scope: everywhere, prepared, input, at, newId }) {
		if (!prepared) return { state: 'unchanged' };
		const scope = within(everywhere, prepared.schoolId);
		const id = input.photographId;
		if (prepared.fault !== undefined) {
			await update(scope, photographs, { id }, { state: 'refused', fault: prepared.fault });
			return { state: 'refused' };
		}
		const ids = { small: newId(), medium: newId(), large: newId() };
		for (const copy of prepared.kept)
			await insert(scope, files, {
				id: ids[copy.name],
				sha256: copy.sha256,
				mediaType: copy.mediaType,
				bytes: copy.bytes,
				role: 'copy',
				widthPx: copy.widthPx,
				heightPx: copy.heightPx,
				createdAt: at.toISOString()
			});
		await update(
			scope,
			photographs,
			{ id, state: 'received' },
			{
				state: 'ready',
				smallFileId: ids.small,
				mediumFileId: ids.medium,
				largeFileId: ids.large,
				likeness: prepared.answer.likeness,
				tagFound: await tagIn(scope, id, prepared.answer.tags)
			}
		);
		return { state: 'ready' };
	}
});

async function tagIn(scope: SchoolScope, photographId: string, tags: readonly string[]) {
	const photograph = await findPhotograph(scope, photographId);
	const attempt = photograph && (await findSubmission(scope, photograph.submissionId));
	return attempt ? tagFound(attempt.tagCode, tags) : 'none';
}
