import { z } from 'zod';
import { figure, words } from '../blocks';
import { reasonWords, shortWords } from '../fields';
import { mailKind } from '../kind';

export const certificateWithdrawn = mailKind({
	name: 'certificate-withdrawn',
	payload: z.object({
		name: shortWords,
		courseTitle: shortWords,
		code: shortWords,
		reason: reasonWords
	}),
	secret: [],
	example: {
		name: 'Ines Vartdal',
		courseTitle: 'Crankpins and shells',
		code: 'RL-0000-0000-0000',
		reason: 'The readings were another student’s.'
	},
	subject: ({ courseTitle }) => `Certificate withdrawn: ${courseTitle}`,
	body: ({ name, courseTitle, code, reason }) => [
		words(
			`${name}, the certificate for ${courseTitle} has been withdrawn. It shows wherever it is checked.`
		),
		figure('Code', code),
		words(`Because: ${reason}`),
		words('If you think this is wrong, you can appeal at your school.')
	]
});
