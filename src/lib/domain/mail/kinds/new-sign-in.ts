import { z } from 'zod';
import { figure, link, words } from '../blocks';
import { shortWords, webAddress } from '../fields';
import { mailKind } from '../kind';
import { instantWords } from '../instant-words';

export const newSignIn = mailKind({
	name: 'new-sign-in',
	payload: z.object({
		name: shortWords,
		/** As the browser calls itself, shortened: "Firefox on Linux". */
		device: shortWords,
		at: z.iso.datetime(),
		address: webAddress
	}),
	secret: [],
	example: {
		name: 'Ines Vartdal',
		device: 'Firefox on Linux',
		at: '2026-03-04T08:15:00Z',
		address: 'https://ringland.example/account'
	},
	subject: () => 'A sign-in from a new device',
	body: ({ name, device, at, address }, school) => [
		words(`${name}, your account was used to sign in on a device that it was not used on before.`),
		figure('Device', device),
		figure('When', instantWords(at, school)),
		words(
			'If it was you, there is nothing to do. If not, sign that device out and set a new password.'
		),
		link('See your devices', address)
	]
});
