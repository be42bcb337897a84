import { newRequestKey, write } from '../api/call';
import { emptyFor, keepWaiting, takeOut, waitingFor, type Waiting } from './outbox';

export type SittingQuestion = {
	id: string;
	position: number;
	kind: string;
	face: unknown;
	response: unknown;
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
	'opening' | 'saved' | 'saving' | 'offline' | 'signed-out' | 'other-device' | 'ended';

const retryMs = 3000;

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
	#epoch = 0;
	#number = 0;
	#sending = false;
	#timer: ReturnType<typeof setTimeout> | undefined;
	#ticker: ReturnType<typeof setInterval> | undefined;

	constructor(
		private readonly api: string,
		private readonly sittingId: string
	) {}

	async open(): Promise<void> {
		const answer = await write<Opened>(`${this.api}/open`, {
			requestKey: newRequestKey(),
			device: navigator.userAgent.slice(0, 200)
		});
		if (answer.kind === 'problem') {
			this.state = 'ended';
			this.detail = answer.detail;
			return;
		}
		if (answer.kind !== 'done') {
			this.state = answer.kind;
			this.#timer = setTimeout(() => void this.open(), retryMs);
			return;
		}
		const { epoch, questions, title, permittedAids } = answer.value;
		this.#epoch = epoch;
		this.#startClock(answer.value);
		const held = await waitingFor(this.sittingId);
		this.responses = Object.fromEntries(
			questions.map((one) => [
				one.id,
				held.find((waiting) => waiting.questionId === one.id)?.response ?? one.response
			])
		);
		this.questions = questions;
		this.title = title;
		this.permittedAids = permittedAids;
		// What an earlier visit of this device could not send belongs to the student: it goes again, under the new epoch.
		for (const one of held) await this.#put(one.questionId, one.response);
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
		clearTimeout(this.#timer);
		clearInterval(this.#ticker);
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
		this.waiting = (await waitingFor(this.sittingId)).length;
	}

	async #flush(): Promise<void> {
		if (this.#sending || this.state === 'other-device' || this.state === 'ended') return;
		this.#sending = true;
		clearTimeout(this.#timer);
		try {
			for (;;) {
				const [next] = await waitingFor(this.sittingId);
				if (!next) break;
				this.state = 'saving';
				if (!(await this.#send(next))) return;
			}
			this.waiting = 0;
			this.state = 'saved';
		} finally {
			this.#sending = false;
			this.waiting = (await waitingFor(this.sittingId)).length;
		}
	}

	async #send(one: Waiting): Promise<boolean> {
		const { requestKey, epoch, number, questionId, response } = one;
		const body = { requestKey, epoch, number, questionId, response };
		const answer = await write<{ verdict: string }>(`${this.api}/responses`, body);
		if (answer.kind === 'done') {
			if (answer.value.verdict === 'other-epoch') {
				this.state = 'other-device';
				return false;
			}
			await takeOut(one);
			return true;
		}
		if (answer.kind === 'problem') {
			this.detail = answer.detail;
			// Ended: nothing more can be taken. Anything else is this one's own fault and must not hold up the rest.
			if (answer.status === 410) this.state = 'ended';
			else await takeOut(one);
			if (answer.status === 410) await emptyFor(this.sittingId);
			return answer.status !== 410;
		}
		this.state = answer.kind;
		this.#timer = setTimeout(() => void this.#flush(), retryMs);
		return false;
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
