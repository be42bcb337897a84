import { z } from 'zod';
import { link, list, words, type Block } from '../blocks';
import { reasonWords, shortWords, webAddress } from '../fields';
import { mailKind } from '../kind';

export const submissionMarked = mailKind({
	name: 'submission-marked',
	payload: z.object({
		name: shortWords,
		jobSheetTitle: shortWords,
		attempt: z.int().min(1),
		decision: z.enum(['competent', 'not-yet']),
		/** What to do again, one line each; the rest stands. */
		redo: z.array(reasonWords).max(50),
		address: webAddress
	}),
	secret: [],
	example: {
		name: 'Ines Vartdal',
		jobSheetTitle: 'Measure a crankpin',
		attempt: 1,
		decision: 'not-yet',
		redo: ['Take the taper of pin 2 again, with the 0.001 mm instrument.'],
		address: 'https://ringland.example/s/averholm/job-sheets/example'
	},
	subject: ({ jobSheetTitle, decision }) =>
		decision === 'competent'
			? `Marked: ${jobSheetTitle}, competent`
			: `Marked: ${jobSheetTitle}, not yet competent`,
	body: ({ name, jobSheetTitle, attempt, decision, redo, address }) => [
		words(`${name}, attempt ${attempt} at ${jobSheetTitle} has been marked.`),
		...(decision === 'competent' ? [words('Decision: competent.')] : notYet(redo)),
		link('See the marks', address)
	]
});

function notYet(redo: readonly string[]): Block[] {
	const decision = words('Decision: not yet competent. What was good stands.');
	return redo.length === 0 ? [decision] : [decision, words('To do again:'), list(redo)];
}
