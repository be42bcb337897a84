import type { Readable } from 'node:stream';
import type { MediaType } from './media-type';

/** `<school>/<aa>/<sha256>`: the same content in one school is one file. Never shown to a browser. */
export type StorageKey = string;

export type Incoming = AsyncIterable<Uint8Array>;

/** Bytes in quarantine: on disk, weighed and looked at, not yet anybody's. */
export type Received = { path: string; bytes: number; sha256: string; mediaType: MediaType };

export type Kept = { key: StorageKey; bytes: number; sha256: string; mediaType: MediaType };

/** A part of a file, both ends included, as HTTP's Range counts. */
export type Part = { start: number; end: number };

export type Opened = { stream: Readable; bytes: number; part: Part };

export type Storage = {
	/**
	 * Streams into quarantine. Nothing of it stays behind when it is refused.
	 * @throws Problem 'too-large' past the limit, 'input' for nothing or for a kind not listed
	 */
	receive: (
		incoming: Incoming,
		allowed: { bytesAtMost: number; mediaTypes: readonly MediaType[] }
	) => Promise<Received>;
	/** Moves it to its school. When this returns, file and folders are on the disk itself. */
	keep: (received: Received, schoolId: string) => Promise<Kept>;
	/** The same for a file made here (a clean copy, a certificate): it is moved away from `path`. */
	keepMade: (path: string, schoolId: string, mediaType: MediaType) => Promise<Kept>;
	discard: (received: Received) => Promise<void>;
	/** A folder of its own for making files. It goes when `keepMade` has taken the last of them. */
	workFolder: () => Promise<string>;
	/** Where a program of ours may read the file: for image work, never for an answer. */
	pathOf: (key: StorageKey) => string;
	/** @throws Problem 'absent'; 'input' for a part that lies outside */
	open: (key: StorageKey, part?: { start?: number; end?: number }) => Promise<Opened>;
	/** Removing what is gone already is no fault. */
	remove: (key: StorageKey) => Promise<void>;
	/**
	 * Removes files that no row knows and that lay untouched since `untouchedSinceMs` (an upload
	 * between file and row is no orphan), and what was left in quarantine.
	 */
	sweep: (
		isKnown: (key: StorageKey) => Promise<boolean>,
		untouchedSinceMs: number
	) => Promise<Swept>;
};

export type Swept = { kept: number; removed: StorageKey[]; quarantineRemoved: number };

export function storageKey(schoolId: string, sha256: string): StorageKey {
	if (!/^[0-9A-Za-z]{1,64}$/.test(schoolId)) throw new Error('schoolId is not a plain id');
	if (!/^[0-9a-f]{64}$/.test(sha256)) throw new Error('sha256 is not a hash');
	return `${schoolId}/${sha256.slice(0, 2)}/${sha256}`;
}

export function isStorageKey(text: string): boolean {
	return /^[0-9A-Za-z]{1,64}\/([0-9a-f]{2})\/\1[0-9a-f]{62}$/.test(text);
}
