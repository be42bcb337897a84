import { z } from 'zod';
import { link, small, words } from '../blocks';
import { count, shortWords, webAddress } from '../fields';
import { mailKind } from '../kind';

export const invitation = mailKind({
	name: 'invitation',
	payload: z.object({
		name: shortWords,
		schoolName: shortWords,
		courseTitle: shortWords,
		cohortTitle: shortWords,
		heldForDays: count,
		link: webAddress
	}),
	secret: ['link'],
	example: {
		name: 'Ines Vartdal',
		schoolName: 'Averholm Trade School',
		courseTitle: 'Crankpins and shells',
		cohortTitle: 'Spring evenings',
		heldForDays: 14,
		link: 'https://ringland.example/invitation/example'
	},
	subject: ({ courseTitle, schoolName }) => `Your place in ${courseTitle} at ${schoolName}`,
	body: ({ name, schoolName, courseTitle, cohortTitle, heldForDays, link: to }) => [
		words(`${name}, ${schoolName} has a place for you in ${courseTitle}, cohort ${cohortTitle}.`),
		link('Take the place', to),
		words(
			`The link works once, for ${heldForDays} days. If you have an account already, you sign in and nothing in it changes. If not, you set a password.`
		),
		small(`If you do not know ${schoolName}, do nothing: no account was made.`)
	]
});
