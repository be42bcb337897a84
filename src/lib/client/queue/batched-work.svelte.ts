import { newRequestKey, write } from '../api/call';

export type SaveState = 'saved' | 'saving' | 'offline' | 'signed-out' | 'conflict' | 'closed';
type Conflict<Body> = { version: number; body: Body; by?: string };
type Batch = { requestKey: string; baseVersion: number; count: number };
type Held<Operation> = { operations: Operation[]; sending: Batch | null; baseVersion: number };

export type WorkOn<Body, Operation> = {
	/** Where batches are sent. */
	path: string;
	/** Under which name this browser keeps what is not sent yet. */
	storageKey: string;
	apply: (body: Body, operation: Operation) => Body;
	/** Whether the later one stands for the earlier, so that only it need be sent. */
	followsOn?: (earlier: Operation, later: Operation) => boolean;
};

const pauseMs = 400;
const retryMs = 4000;
const batchAtMost = 200;

/**
 * Something that is typed in one browser and lies on the server: each change is applied at once,
 * kept in this browser, and sent in small batches on top of a named version. When somebody else
 * was faster, both sides are held until a person chooses. A batch is sent again under the key and
 * version that it was sent under first, so that an answer that got lost is no conflict.
 */
export class BatchedWork<Body, Operation> {
	/** Never changed in place: every change gives a new one. */
	body = $state.raw<Body>() as Body;
	state = $state<SaveState>('saved');
	detail = $state('');
	conflict = $state.raw<Conflict<Body> | null>(null);
	version = $state(0);
	#pending: Operation[] = [];
	#sending: Batch | null = null;
	#isUnderWay = false;
	#timer: ReturnType<typeof setTimeout> | undefined;

	constructor(
		private readonly on: WorkOn<Body, Operation>,
		server: { body: Body; version: number }
	) {
		this.body = server.body;
		this.version = server.version;
	}

	/** What is typed here and not on the server yet. */
	get unsent(): readonly Operation[] {
		return this.#pending;
	}

	/** Takes up what an earlier visit could not send. Called once the page runs in a browser. */
	resume(): void {
		const held = this.#heldHere();
		if (!held) return;
		this.#pending = held.operations;
		this.#sending = held.sending;
		for (const one of this.#pending) this.body = this.on.apply(this.body, one);
		// They were typed on that version: what the server has now may be somebody else's.
		this.version = held.baseVersion;
		void this.#flush();
	}

	do(operation: Operation): void {
		this.body = this.on.apply(this.body, operation);
		const last = this.#pending.length - 1;
		const earlier = this.#pending[last];
		// What is on its way is not changed any more.
		const isFree = last >= (this.#sending?.count ?? 0);
		if (isFree && earlier !== undefined && this.on.followsOn?.(earlier, operation))
			this.#pending[last] = operation;
		else this.#pending.push(operation);
		this.#keep();
		if (this.state !== 'closed' && this.state !== 'conflict') this.state = 'saving';
		clearTimeout(this.#timer);
		this.#timer = setTimeout(() => void this.#flush(), pauseMs);
	}

	/** Resolves once nothing waits to be sent, or sending is not possible now. */
	async settled(): Promise<boolean> {
		clearTimeout(this.#timer);
		await this.#flush();
		while (this.#isUnderWay) await new Promise((resolve) => setTimeout(resolve, 50));
		return this.state === 'saved';
	}

	/** Lays what was typed here over what the other saved; the other's other changes stay. */
	takeMine(): void {
		if (!this.conflict) return;
		this.version = this.conflict.version;
		this.body = this.#pending.reduce((held, one) => this.on.apply(held, one), this.conflict.body);
		this.#settle();
		this.#keep();
		void this.#flush();
	}

	takeTheirs(): void {
		if (!this.conflict) return;
		({ version: this.version, body: this.body } = this.conflict);
		this.#pending = [];
		this.#settle();
		this.#keep();
		this.state = 'saved';
	}

	#settle(): void {
		this.conflict = null;
		this.#sending = null;
	}

	async #flush(): Promise<void> {
		if (this.#isUnderWay || this.conflict) return;
		if (this.#pending.length === 0) {
			this.state = 'saved';
			return;
		}
		this.#sending ??= {
			requestKey: newRequestKey(),
			baseVersion: this.version,
			count: Math.min(this.#pending.length, batchAtMost)
		};
		const { requestKey, baseVersion, count } = this.#sending;
		this.#keep();
		this.state = 'saving';
		this.#isUnderWay = true;
		const answer = await write<{ version: number }>(this.on.path, {
			requestKey,
			baseVersion,
			operations: $state.snapshot(this.#pending.slice(0, count))
		});
		this.#isUnderWay = false;
		if (answer.kind === 'done') {
			this.version = answer.value.version;
			this.#pending = this.#pending.slice(count);
			this.#sending = null;
			this.#keep();
			return this.#flush();
		}
		if (answer.kind === 'problem' && answer.status === 409 && answer.conflict) {
			this.conflict = answer.conflict as Conflict<Body>;
			this.state = 'conflict';
		} else if (answer.kind === 'problem') {
			this.state = 'closed';
			this.detail = answer.detail;
		} else {
			this.state = answer.kind;
			if (answer.kind === 'offline') this.#timer = setTimeout(() => void this.#flush(), retryMs);
		}
	}

	#keep(): void {
		const { storageKey } = this.on;
		if (this.#pending.length === 0) return localStorage.removeItem(storageKey);
		const held: Held<Operation> = {
			operations: this.#pending,
			sending: this.#sending,
			baseVersion: this.version
		};
		localStorage.setItem(storageKey, JSON.stringify(held));
	}

	#heldHere(): Held<Operation> | undefined {
		const text = localStorage.getItem(this.on.storageKey);
		return text ? (JSON.parse(text) as Held<Operation>) : undefined;
	}
}
