import { z } from 'zod';
import { figure, link, words } from '../blocks';
import { shortWords, webAddress } from '../fields';
import { mailKind } from '../kind';

export const certificateReady = mailKind({
	name: 'certificate-ready',
	payload: z.object({
		name: shortWords,
		courseTitle: shortWords,
		code: shortWords,
		/** The student's page, behind the sign-in. */
		address: webAddress,
		/** The public page that anyone can check it on. */
		checkAddress: webAddress
	}),
	secret: [],
	example: {
		name: 'Ines Vartdal',
		courseTitle: 'Crankpins and shells',
		code: 'RL-0000-0000-0000',
		address: 'https://ringland.example/s/averholm/certificates/example',
		checkAddress: 'https://ringland.example/check/RL-0000-0000-0000'
	},
	subject: ({ courseTitle }) => `Your certificate: ${courseTitle}`,
	body: ({ name, courseTitle, code, address, checkAddress }) => [
		words(`${name}, your certificate for ${courseTitle} is ready.`),
		link('Fetch the certificate', address),
		figure('Code', code),
		words(`An employer can check it without an account at ${checkAddress}`)
	]
});
