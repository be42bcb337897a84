import { z } from 'zod';
import { link, words } from '../blocks';
import { reasonWords, shortWords, webAddress } from '../fields';
import { mailKind } from '../kind';

export const awardDecided = mailKind({
	name: 'award-decided',
	payload: z.object({
		name: shortWords,
		courseTitle: shortWords,
		decision: z.enum(['awarded', 'declined']),
		/** Said when it was declined. */
		reason: reasonWords.nullish(),
		address: webAddress
	}),
	secret: [],
	example: {
		name: 'Ines Vartdal',
		courseTitle: 'Crankpins and shells',
		decision: 'declined',
		reason: 'The witness card of the second job sheet is not signed.',
		address: 'https://ringland.example/s/averholm/certificates'
	},
	subject: ({ courseTitle, decision }) =>
		decision === 'awarded' ? `Awarded: ${courseTitle}` : `Not awarded yet: ${courseTitle}`,
	body: ({ name, courseTitle, decision, reason, address }) => [
		words(
			decision === 'awarded'
				? `${name}, a verifier has looked at your work in ${courseTitle} and has made the award.`
				: `${name}, a verifier has looked at your work in ${courseTitle} and has declined the award for now.`
		),
		...(reason ? [words(`Because: ${reason}`)] : []),
		link('See the decision', address)
	]
});
