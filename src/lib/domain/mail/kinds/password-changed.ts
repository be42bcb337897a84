import { z } from 'zod';
import { link, words } from '../blocks';
import { shortWords, webAddress } from '../fields';
import { mailKind } from '../kind';

export const passwordChanged = mailKind({
	name: 'password-changed',
	payload: z.object({ name: shortWords, address: webAddress }),
	secret: [],
	example: { name: 'Ines Vartdal', address: 'https://ringland.example/password' },
	subject: () => 'Your password was changed',
	body: ({ name, address }) => [
		words(
			`${name}, the password of your account was changed, and every other device was signed out.`
		),
		words('If it was not you, set a new password now and tell your school.'),
		link('Set a new password', address)
	]
});
