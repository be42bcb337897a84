import { mayResend } from '$lib/domain/sync/may-resend';
import { newRequestKey, write } from '../api/call';
import { emptyFor, keepWaiting, setAside, takeOut, waitingFor, type Waiting } from './outbox';
import { backoffMs, whatNext, worksLater } from './what-next';

export type SittingQuestion = {
	id: string;
	position: number;
	kind: string;
	face: unknown;
	response: unknown;
	/** The epoch and number of the response that the server holds. */
	given: { epoch: number; number: number } | null;
};
type Opened = {
	title: string;
	permittedAids: string[];
	number: number;
	epoch: number;
	deadlineAt: string | null;
	serverNow: string;
	questions: SittingQuestion[];
};
export type SessionState =
	'opening' | 'saved' | 'saving' | 'offline' | 'signed-out' | 'refused' | 'other-device' | 'ended';

/**
 * One sitting in one browser. Opening it begins a new epoch; every response is on this device's
 * disk first, then sent in order under (epoch, number), and repeated until the server says that it
 * has it. The clock shown is the server's, carried on by this machine's running time alone.
 */
export class SittingSession {
	state = $state<SessionState>('opening');
	detail = $state('');
	questions = $state<SittingQuestion[]>([]);
	responses = $state<Record<string, unknown>>({});
	title = $state('');
	permittedAids = $state<string[]>([]);
	leftMs = $state<number | null>(null);
	waiting = $state(0);
	/** Responses that waited here while another device answered the same question: not taken. */
	overtaken = $state(0);
	#epoch = 0;
	#number = 0;
	#failures = 0;
	#closed = false;
	#sending = false;
	#timer: ReturnType<typeof setTimeout> | undefined;
	#ticker: ReturnType<typeof setInterval> | undefined;

	constructor(
		private readonly api: string,
		private readonly sittingId: string
	) {}

	async open(): Promise<void> {
		addEventListener('online', this.#now);
		document.addEventListener('visibilitychange', this.#now);
		let held: Waiting[];
		try {
			held = await waitingFor(this.sittingId);
		} catch {
			this.#end('This browser keeps nothing (a private window does that). Use an ordinary window.');
			return;
		}
		const answer = await write<Opened>(`${this.api}/open`, {
			requestKey: newRequestKey(),
			device: navigator.userAgent.slice(0, 200)
		});
		if (answer.kind === 'problem' && !worksLater(answer.status)) {
			this.#end(answer.detail);
			return;
		}
		if (answer.kind !== 'done') {
			this.state = answer.kind === 'problem' ? 'opening' : answer.kind;
			this.#later(() => this.open());
			return;
		}
		const { epoch, questions, title, permittedAids } = answer.value;
		this.#failures = 0;
		this.#epoch = epoch;
		this.#startClock(answer.value);
		// What an earlier visit of this device could not send goes again, under the new epoch, unless
		// another device has answered the same question since.
		const again = held.filter((one) => {
			const question = questions.find(({ id }) => id === one.questionId);
			return mayResend(one, question?.given ?? null);
		});
		this.responses = Object.fromEntries(
			questions.map((one) => [
				one.id,
				again.find((waiting) => waiting.questionId === one.id)?.response ?? one.response
			])
		);
		this.questions = questions;
		this.title = title;
		this.permittedAids = permittedAids;
		for (const one of again) await this.#put(one.questionId, one.response);
		this.state = 'saved';
		void this.#flush();
	}

	/** A response as it is given. */
	async respond(questionId: string, response: unknown): Promise<void> {
		this.responses[questionId] = response;
		this.state = 'saving';
		await this.#put(questionId, $state.snapshot(response));
		void this.#flush();
	}

	/** Resolves to whether everything has reached the server. */
	async settled(): Promise<boolean> {
		await this.#flush();
		return this.waiting === 0 && this.state === 'saved';
	}

	close(): void {
		this.#closed = true;
		removeEventListener('online', this.#now);
		document.removeEventListener('visibilitychange', this.#now);
		clearTimeout(this.#timer);
		clearInterval(this.#ticker);
	}

	/** The network or the person is back: no need to wait out the pause. */
	readonly #now = () => {
		if (document.visibilityState !== 'hidden') this.#retry?.();
	};
	#retry: (() => void) | undefined;

	#later(work: () => Promise<void>): void {
		clearTimeout(this.#timer);
		if (this.#closed) return;
		this.#retry = () => {
			clearTimeout(this.#timer);
			this.#retry = undefined;
			void work();
		};
		this.#timer = setTimeout(this.#retry, backoffMs(this.#failures++));
	}

	#end(because: string): void {
		this.state = 'ended';
		this.detail = because;
	}

	async #put(questionId: string, response: unknown): Promise<void> {
		this.#number += 1;
		await keepWaiting({
			questionId,
			sittingId: this.sittingId,
			requestKey: newRequestKey(),
			epoch: this.#epoch,
			number: this.#number,
			response
		});
		await this.#count();
	}

	async #count(): Promise<void> {
		const kept = await waitingFor(this.sittingId);
		this.waiting = kept.filter((one) => one.refused === undefined).length;
	}

	async #flush(): Promise<void> {
		if (this.#sending || this.state === 'other-device' || this.state === 'ended') return;
		this.#sending = true;
		clearTimeout(this.#timer);
		try {
			for (;;) {
				const kept = await waitingFor(this.sittingId);
				const next = kept.find((one) => one.refused === undefined);
				if (!next) {
					this.detail = kept[0]?.refused ?? '';
					this.state = kept.length > 0 ? 'refused' : 'saved';
					return;
				}
				if (this.state !== 'offline') this.state = 'saving';
				if (!(await this.#send(next))) return;
			}
		} finally {
			this.#sending = false;
			await this.#count();
		}
	}

	/** Resolves to whether the line may go on. */
	async #send(one: Waiting): Promise<boolean> {
		const { requestKey, epoch, number, questionId, response } = one;
		const body = { requestKey, epoch, number, questionId, response };
		const answer = await write<{ verdict: string }>(`${this.api}/responses`, body);
		const next = whatNext(answer);
		switch (next) {
			case 'saved':
				this.#failures = 0;
				this.state = 'saving';
				await takeOut(one);
				return true;
			case 'other-device':
				if (epoch >= this.#epoch) {
					this.state = 'other-device';
					return false;
				}
				// It waited through another device's opening: the server keeps it as a fact.
				this.overtaken += 1;
				await takeOut(one);
				return true;
			case 'refused':
				await setAside(one, answer.kind === 'problem' ? answer.detail : '');
				return true;
			case 'over':
				this.#end(answer.kind === 'problem' ? answer.detail : '');
				await emptyFor(this.sittingId);
				return false;
			default:
				this.state = next === 'again' ? 'saving' : next;
				this.#later(() => this.#flush());
				return false;
		}
	}

	#startClock({ deadlineAt, serverNow }: Opened): void {
		clearInterval(this.#ticker);
		if (deadlineAt === null) return;
		const begunAt = performance.now();
		const left = Date.parse(deadlineAt) - Date.parse(serverNow);
		const tick = () => (this.leftMs = Math.max(0, left - (performance.now() - begunAt)));
		tick();
		this.#ticker = setInterval(tick, 1000);
	}
}
