import { z } from 'zod';
import { link, small, words } from '../blocks';
import { count, webAddress } from '../fields';
import { mailKind } from '../kind';

export const passwordReset = mailKind({
	name: 'password-reset',
	payload: z.object({ heldForMinutes: count, link: webAddress }),
	secret: ['link'],
	example: { heldForMinutes: 60, link: 'https://ringland.example/password/example' },
	subject: () => 'Set a new password',
	body: ({ heldForMinutes, link: to }) => [
		words('Somebody asked to set a new password for the account with this address.'),
		link('Set a new password', to),
		words(
			`The link works once, for ${heldForMinutes} minutes. Setting a new password signs every other device out.`
		),
		small('If it was not you, do nothing: the password stays as it is.')
	]
});
