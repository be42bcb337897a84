import { openDB, type DBSchema, type IDBPDatabase } from 'idb';

/** A response that waits to be sent. The newest of a question replaces the one before. */
export type Waiting = {
	questionId: string;
	sittingId: string;
	requestKey: string;
	epoch: number;
	number: number;
	response: unknown;
	/** Set aside: the server would not take it, and said why. Tried again when the page is opened. */
	refused?: string;
};

interface Boxes extends DBSchema {
	waiting: { key: string; value: Waiting; indexes: { sitting: string } };
}

let opened: Promise<IDBPDatabase<Boxes>> | undefined;

function box(): Promise<IDBPDatabase<Boxes>> {
	return (opened ??= openDB<Boxes>('ringland-outbox', 1, {
		upgrade(database) {
			const store = database.createObjectStore('waiting', { keyPath: 'questionId' });
			store.createIndex('sitting', 'sittingId');
		}
	}));
}

/** On this device's disk before anything is sent: closing the browser loses nothing. */
export async function keepWaiting(one: Waiting): Promise<void> {
	await (await box()).put('waiting', one);
}

/** Takes one out once it is saved, unless a newer one has taken its place meanwhile. */
export async function takeOut(sent: Waiting): Promise<void> {
	const transaction = (await box()).transaction('waiting', 'readwrite');
	const held = await transaction.store.get(sent.questionId);
	if (held?.requestKey === sent.requestKey) await transaction.store.delete(sent.questionId);
	await transaction.done;
}

/** Keeps one that was refused, unless a newer one has taken its place meanwhile. */
export async function setAside(refused: Waiting, because: string): Promise<void> {
	const transaction = (await box()).transaction('waiting', 'readwrite');
	const held = await transaction.store.get(refused.questionId);
	if (held?.requestKey === refused.requestKey)
		await transaction.store.put({ ...held, refused: because });
	await transaction.done;
}

export async function waitingFor(sittingId: string): Promise<Waiting[]> {
	const all = await (await box()).getAllFromIndex('waiting', 'sitting', sittingId);
	return all.sort((a, b) => a.epoch - b.epoch || a.number - b.number);
}

export async function emptyFor(sittingId: string): Promise<void> {
	for (const one of await waitingFor(sittingId))
		await (await box()).delete('waiting', one.questionId);
}
