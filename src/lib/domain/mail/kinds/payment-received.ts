import { z } from 'zod';
import { money, moneyWords } from '../../money';
import { figure, words } from '../blocks';
import { count, shortWords } from '../fields';
import { mailKind } from '../kind';

export const paymentReceived = mailKind({
	name: 'payment-received',
	payload: z.object({
		name: shortWords,
		cohortTitle: shortWords,
		quantity: z.int().min(1),
		amountMinor: count,
		currency: z.string().regex(/^[A-Z]{3}$/),
		/** How many of those who waited were invited at once. */
		invited: count
	}),
	secret: [],
	example: {
		name: 'Oskar Tindvik',
		cohortTitle: 'Spring evenings',
		quantity: 12,
		amountMinor: 360_000,
		currency: 'EUR',
		invited: 11
	},
	subject: ({ quantity, cohortTitle }) => `${places(quantity)} paid for ${cohortTitle}`,
	body: ({ name, cohortTitle, quantity, amountMinor, currency, invited }, school) => [
		words(`${name}, the payment for ${cohortTitle} has come in, and the places are open.`),
		figure('Places', String(quantity)),
		figure('Amount', moneyWords(money(amountMinor, currency), school?.locale ?? 'en-GB')),
		words(
			invited === 0
				? 'Nobody on the roster was waiting for a place.'
				: `${invited === 1 ? 'One student who was' : `${invited} students who were`} waiting ${invited === 1 ? 'has' : 'have'} been invited.`
		)
	]
});

function places(quantity: number): string {
	return quantity === 1 ? '1 place' : `${quantity} places`;
}
