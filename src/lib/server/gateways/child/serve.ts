import { setPriority } from 'node:os';
import { Problem } from '$lib/domain/problem';
import type { Answer, Question } from './messages';

/** The child's side: answers one question after another until its parent goes. */
export function serve<In, Out>(work: (input: In) => Promise<Out>): void {
	setPriority(10); // pages come first
	process.on('disconnect', () => process.exit(0));
	process.on('message', ({ number, input }: Question<In>) => {
		work(input).then(
			(value) => reply({ number, kind: 'done', value }),
			(error: unknown) => reply(faultAnswer(number, error))
		);
	});
}

function reply<Out>(answer: Answer<Out>): void {
	process.send?.(answer);
}

function faultAnswer(number: number, error: unknown): Answer<never> {
	if (error instanceof Problem) {
		const { code, words, parameters } = error;
		return { number, kind: 'problem', code, words, parameters };
	}
	const text = error instanceof Error ? (error.stack ?? error.message) : String(error);
	return { number, kind: 'fault', text };
}
