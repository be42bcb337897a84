import { createHash, randomUUID } from 'node:crypto';
import { open, rm } from 'node:fs/promises';
import { join } from 'node:path';
import { Problem } from '$lib/domain/problem';
import { mediaTypeOf, sniffBytes, type MediaType } from './media-type';
import type { Incoming, Received } from './storage';

/** Writes, weighs and hashes as the bytes come, so that a large file never lies in memory. */
export async function receiveInto(
	folder: string,
	incoming: Incoming,
	allowed: { bytesAtMost: number; mediaTypes: readonly MediaType[] }
): Promise<Received> {
	const path = join(folder, randomUUID());
	const file = await open(path, 'wx', 0o600);
	const hash = createHash('sha256');
	let bytes = 0;
	let head = Buffer.alloc(0);
	try {
		for await (const chunk of incoming) {
			bytes += chunk.byteLength;
			if (bytes > allowed.bytesAtMost) throw tooLarge(allowed.bytesAtMost);
			if (head.length < sniffBytes)
				head = Buffer.concat([head, chunk.subarray(0, sniffBytes - head.length)]);
			hash.update(chunk);
			await writeAll(file, chunk);
		}
		const mediaType = allowedType(head, allowed.mediaTypes);
		await file.sync();
		await file.close();
		return { path, bytes, sha256: hash.digest('hex'), mediaType };
	} catch (error) {
		await file.close().catch(() => undefined);
		await rm(path, { force: true });
		throw error;
	}
}

async function writeAll(file: Awaited<ReturnType<typeof open>>, chunk: Uint8Array): Promise<void> {
	for (let done = 0; done < chunk.byteLength;)
		done += (await file.write(chunk, done, chunk.byteLength - done)).bytesWritten;
}

function tooLarge(bytesAtMost: number): Problem {
	return new Problem('too-large', 'This file is larger than {most} megabytes.', {
		most: Math.round(bytesAtMost / 1e6)
	});
}

function allowedType(head: Buffer, mediaTypes: readonly MediaType[]): MediaType {
	if (head.length === 0) throw new Problem('input', 'This file is empty.');
	const found = mediaTypeOf(head);
	if (found === 'image/heic')
		throw new Problem(
			'input',
			'This is a HEIC picture. Set the camera to JPEG (most compatible) and take it again.'
		);
	if (found === null || !mediaTypes.includes(found))
		throw new Problem('input', 'This file is not one of {kinds}.', {
			kinds: mediaTypes.map((one) => one.replace(/^\w+\//, '').toUpperCase()).join(', ')
		});
	return found;
}
