import { z } from 'zod';
import { link, small, words } from '../blocks';
import { count, webAddress } from '../fields';
import { mailKind } from '../kind';

export const signInLink = mailKind({
	name: 'sign-in-link',
	payload: z.object({ heldForMinutes: count, link: webAddress }),
	secret: ['link'],
	example: { heldForMinutes: 15, link: 'https://ringland.example/sign-in/link/example' },
	subject: () => 'Your link to sign in',
	body: ({ heldForMinutes, link: to }) => [
		words('Somebody asked to sign in to Ringland with this address.'),
		link('Sign in', to),
		words(`The link works once, for ${heldForMinutes} minutes. It opens a page with a button.`),
		small('If it was not you, do nothing: without this link nobody gets in.')
	]
});
