import { Problem } from '$lib/domain/problem';
import { ChildFault, makeChild } from '../child/child';
import type { ImageAnswer, ImageQuestion } from './copies';
import source from './image-child?child';
import { alsoIs } from './polyglot';

export type Images = {
	/**
	 * Reads a photograph and writes its clean copies into `folder`.
	 * @throws Problem 'input' or 'too-large' where the file is no photograph that can be taken;
	 * 'unavailable' where trying again later may work
	 */
	cleanCopies: (question: ImageQuestion) => Promise<ImageAnswer>;
	close: () => Promise<void>;
};

export function makeImages({ answerWithinMs = 30_000 } = {}): Images {
	const child = makeChild<ImageQuestion, ImageAnswer>({
		source,
		nextTo: import.meta.url,
		heapMb: 384,
		answerWithinMs
	});
	return {
		async cleanCopies(question) {
			const other = await alsoIs(question.source);
			if (other)
				throw new Problem(
					'input',
					'This file is a picture and a second thing at once ({other}). It was not taken.',
					{ other }
				);
			return child.ask(question).catch(askAgainOrRefuse);
		},
		close: child.close
	};
}

function askAgainOrRefuse(error: unknown): never {
	if (!(error instanceof ChildFault)) throw error;
	if (error.reason === 'too-slow')
		throw new Problem('input', 'This picture takes too long to open. Take or send it again.');
	const problem = new Problem('unavailable', 'The picture could not be worked on just now.');
	problem.cause = error; // for the log; a page shows the words alone
	throw problem;
}
