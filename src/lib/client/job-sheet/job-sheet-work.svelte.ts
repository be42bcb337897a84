import {
	applyOperation,
	type Operation,
	type SubmissionBody
} from '$lib/domain/job-sheets/submission';
import { newRequestKey, write } from '../api/call';

type Shapes = Record<string, { rows: number; columns: number }>;
type Conflict = { version: number; body: SubmissionBody };
export type SaveState = 'saved' | 'saving' | 'offline' | 'signed-out' | 'conflict' | 'closed';

const pauseMs = 400;
const retryMs = 4000;

/**
 * An open job sheet in one browser: what is typed is applied at once, kept in this browser, and
 * sent in small batches on top of a named version. When another device was faster, both sides
 * are held until a person chooses.
 */
export class JobSheetWork {
	body = $state<SubmissionBody>() as SubmissionBody;
	state = $state<SaveState>('saved');
	detail = $state('');
	conflict = $state<Conflict | null>(null);
	version = $state(0);
	#pending: Operation[] = [];
	#sending: { requestKey: string; operations: Operation[] } | null = null;
	#timer: ReturnType<typeof setTimeout> | undefined;

	constructor(
		private readonly path: string,
		private readonly storageKey: string,
		private readonly shapes: Shapes,
		server: { body: SubmissionBody; version: number }
	) {
		this.body = server.body;
		this.version = server.version;
	}

	/** Takes up what an earlier visit could not send. Called once the page runs in a browser. */
	resume(): void {
		const held = localStorage.getItem(this.storageKey);
		if (!held) return;
		this.#pending = JSON.parse(held) as Operation[];
		for (const one of this.#pending) this.body = applyOperation(this.body, one, this.shapes);
		void this.#flush();
	}

	do(operation: Operation): void {
		this.body = applyOperation(this.body, operation, this.shapes);
		this.#pending.push(operation);
		this.#keep();
		this.state = 'saving';
		clearTimeout(this.#timer);
		this.#timer = setTimeout(() => void this.#flush(), pauseMs);
	}

	/** Resolves once nothing waits to be sent, or sending is not possible now. */
	async settled(): Promise<boolean> {
		clearTimeout(this.#timer);
		await this.#flush();
		return this.state === 'saved';
	}

	/** Lays what was typed here over what another device saved; the other's other changes stay. */
	takeMine(): void {
		if (!this.conflict) return;
		this.version = this.conflict.version;
		this.body = this.#pending.reduce(
			(held, one) => applyOperation(held, one, this.shapes),
			this.conflict.body
		);
		this.conflict = null;
		void this.#flush();
	}

	takeTheirs(): void {
		if (!this.conflict) return;
		({ version: this.version, body: this.body } = this.conflict);
		this.conflict = null;
		this.#pending = [];
		this.#keep();
		this.state = 'saved';
	}

	async #flush(): Promise<void> {
		if (this.#sending || this.conflict) return;
		if (this.#pending.length === 0) {
			this.state = 'saved';
			return;
		}
		this.#sending = { requestKey: newRequestKey(), operations: this.#pending.slice(0, 200) };
		this.state = 'saving';
		const { requestKey, operations } = this.#sending;
		const answer = await write<{ version: number }>(this.path, {
			requestKey,
			baseVersion: this.version,
			operations: $state.snapshot(operations)
		});
		this.#sending = null;
		if (answer.kind === 'done') {
			this.version = answer.value.version;
			this.#pending = this.#pending.slice(operations.length);
			this.#keep();
			return this.#flush();
		}
		if (answer.kind === 'problem' && answer.status === 409 && answer.conflict) {
			this.conflict = answer.conflict as Conflict;
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
		if (this.#pending.length === 0) localStorage.removeItem(this.storageKey);
		else localStorage.setItem(this.storageKey, JSON.stringify(this.#pending));
	}
}
