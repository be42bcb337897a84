import { z } from 'zod';
import { link, words } from '../blocks';
import { shortWords, webAddress } from '../fields';
import { mailKind } from '../kind';

/** To a verifier. The student's name stays out of it: it is on the page, behind the sign-in. */
export const awardWaiting = mailKind({
	name: 'award-waiting',
	payload: z.object({ name: shortWords, courseTitle: shortWords, address: webAddress }),
	secret: [],
	example: {
		name: 'Halvard Quist',
		courseTitle: 'Crankpins and shells',
		address: 'https://ringland.example/s/averholm/awards'
	},
	subject: ({ courseTitle }) => `An award in ${courseTitle} waits for a decision`,
	body: ({ name, courseTitle, address }) => [
		words(`${name}, the evidence for an award in ${courseTitle} is complete by its rule.`),
		words('You can decide it if you did not mark any of the work.'),
		link('See the evidence', address)
	]
});
