import { spawn, type ChildProcess } from 'node:child_process';
import { dirname } from 'node:path';
import { fileURLToPath } from 'node:url';
import { Problem } from '$lib/domain/problem';
import type { Answer, Question } from './messages';

export type ChildOptions = {
	/** From `import source from './entry?child'`. */
	source: string;
	/** `import.meta.url` of the caller: packages are looked up from there, whatever the cwd is. */
	nextTo: string;
	/** Limit of the JavaScript heap; what libraries take outside it they must bound themselves. */
	heapMb: number;
	answerWithinMs: number;
	/** An idle child leaves after this, and gives its memory back. */
	restAfterMs?: number;
};

export type Child<In, Out> = {
	/** Questions wait in one line. @throws Problem as the child threw it, or ChildFault. */
	ask: (input: In) => Promise<Out>;
	close: () => Promise<void>;
};

/** The child took too long, died, or met a fault of ours: not the asker's mistake. */
export class ChildFault extends Error {
	constructor(
		readonly reason: 'too-slow' | 'died' | 'fault',
		words: string
	) {
		super(words);
		this.name = 'ChildFault';
	}
}

export function makeChild<In, Out>(options: ChildOptions): Child<In, Out> {
	let running: ChildProcess | undefined;
	let line: Promise<unknown> = Promise.resolve();
	let rest: NodeJS.Timeout | undefined;
	let number = 0;

	/** Forgets at once: one that was told to go may take a moment, and must not get a question. */
	const forget = (child: ChildProcess) => {
		if (running === child) running = undefined;
	};

	async function turn(input: In): Promise<Out> {
		clearTimeout(rest);
		running ??= start(options, forget);
		const child = running;
		hold(child, true);
		try {
			return await exchange<In, Out>(child, { number: ++number, input }, options.answerWithinMs);
		} catch (error) {
			if (error instanceof ChildFault && error.reason !== 'fault') forget(child);
			throw error;
		} finally {
			hold(child, false);
			rest = setTimeout(() => {
				forget(child);
				if (child.connected) child.disconnect();
			}, options.restAfterMs ?? 30_000);
			rest.unref();
		}
	}

	return {
		ask(input) {
			const mine = line.then(() => turn(input));
			line = mine.catch(() => undefined);
			return mine;
		},
		async close() {
			await line;
			clearTimeout(rest);
			const child = running;
			if (!child) return;
			const gone = new Promise((done) => child.once('exit', done));
			child.ref();
			child.kill('SIGKILL');
			await gone;
		}
	};
}

function start(options: ChildOptions, onGone: (child: ChildProcess) => void): ChildProcess {
	const child = spawn(
		process.execPath,
		[`--max-old-space-size=${options.heapMb}`, '--input-type=module', '-'],
		{
			cwd: dirname(fileURLToPath(options.nextTo)),
			env: {}, // a library that a hostile file takes over finds no secret here
			stdio: ['pipe', 'ignore', 'pipe', 'ipc'],
			serialization: 'advanced'
		}
	);
	child.stdin?.on('error', () => undefined); // its exit says more
	child.stdin?.end(options.source);
	child.once('exit', () => onGone(child));
	child.once('error', () => onGone(child));
	return child;
}

/** Only a child with a question keeps the process alive. */
function hold(child: ChildProcess, held: boolean): void {
	const [, , stderr] = child.stdio as unknown as [unknown, unknown, { ref(): void; unref(): void }];
	for (const one of [child, child.channel, stderr])
		if (held) one?.ref();
		else one?.unref();
}

function exchange<In, Out>(
	child: ChildProcess,
	question: Question<In>,
	withinMs: number
): Promise<Out> {
	return new Promise<Out>((resolve, reject) => {
		let last = '';
		const clock = setTimeout(() => {
			child.kill('SIGKILL');
			settle(() => reject(new ChildFault('too-slow', `No answer within ${withinMs} ms.`)));
		}, withinMs);
		const hear = (chunk: Buffer) => (last = (last + chunk.toString('utf8')).slice(-2000));
		const gone = () => settle(() => reject(new ChildFault('died', `The child ended. ${last}`)));
		const answered = (answer: Answer<Out>) => {
			if (answer.number !== question.number) return;
			settle(() => {
				if (answer.kind === 'done') resolve(answer.value);
				else if (answer.kind === 'fault') reject(new ChildFault('fault', answer.text));
				else reject(new Problem(answer.code, answer.words, answer.parameters));
			});
		};
		const settle = (end: () => void) => {
			clearTimeout(clock);
			child.off('message', answered).off('exit', gone).off('error', gone);
			child.stderr?.off('data', hear);
			end();
		};
		child.on('message', answered).on('exit', gone).on('error', gone);
		child.stderr?.on('data', hear);
		child.send(question, (error) => error && gone());
	});
}
