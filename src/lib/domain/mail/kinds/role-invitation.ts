import { z } from 'zod';
import { link, small, words } from '../blocks';
import { count, shortWords, webAddress } from '../fields';
import { mailKind } from '../kind';

export const roleInvitation = mailKind({
	name: 'role-invitation',
	payload: z.object({
		name: shortWords,
		schoolName: shortWords,
		/** "instructor", "instructor and verifier". */
		roleWords: shortWords,
		heldForDays: count,
		link: webAddress
	}),
	secret: ['link'],
	example: {
		name: 'Marit Oyelaran',
		schoolName: 'Averholm Trade School',
		roleWords: 'instructor and verifier',
		heldForDays: 14,
		link: 'https://ringland.example/invitation/example'
	},
	subject: ({ schoolName, roleWords }) => `${schoolName} asks you to be ${roleWords}`,
	body: ({ name, schoolName, roleWords, heldForDays, link: to }) => [
		words(`${name}, ${schoolName} asks you to work in Ringland as ${roleWords}.`),
		link('Accept', to),
		words(`The link works once, for ${heldForDays} days.`),
		small(`If you do not know ${schoolName}, do nothing: no account was made.`)
	]
});
