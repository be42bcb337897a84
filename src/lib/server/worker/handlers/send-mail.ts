import { mailStateAfter } from '$lib/domain/mail/delivery';
import { renderMail } from '$lib/domain/mail/registry';
import { Problem } from '$lib/domain/problem';
import { changeMail, findMail } from '../../data/queries/mails';
import { schoolById } from '../../data/queries/schools';
import { commonScope } from '../../data/scope';
import { inTransaction } from '../../data/transaction';
import type { House } from '../../services/house';

/**
 * Sends one message at least once under a Message-ID that never changes. "Sending" is on disk
 * before the mail server hears of it: when the process dies in between, nobody can know whether
 * it went out, and the office is shown just that instead of a guess.
 */
export async function sendMail(house: House, payload: Record<string, unknown>): Promise<void> {
	const { database, gateways, config } = house;
	const id = String(payload.mailId);
	const mail = await findMail(commonScope(database, null), id);
	if (!mail || mail.state === 'sent' || mail.state === 'refused') return;
	const note = (change: Parameters<typeof changeMail>[2]) =>
		inTransaction(database, (transaction) =>
			changeMail(commonScope(database, transaction), id, change)
		);
	if (mail.state === 'sending') {
		await note({ state: 'unsure', fault: 'The server stopped while this was being sent.' });
		return;
	}
	const school = mail.schoolId
		? await schoolById(commonScope(database, null), mail.schoolId)
		: undefined;
	const links = mail.sealed
		? (JSON.parse(gateways.signing.open(mail.sealed, id)) as Record<string, string>)
		: {};
	const message = renderMail(mail.kind, { ...mail.payload, ...links }, school);
	await note({ state: 'sending', attempts: mail.attempts + 1 });
	const outcome = await gateways.mailer.send({
		messageId: mail.messageId,
		from: config.MAIL_FROM,
		to: mail.recipient,
		...message
	});
	const state = mailStateAfter(outcome.kind);
	await note({
		state,
		fault: outcome.kind === 'sent' ? null : outcome.because,
		sentAt: outcome.kind === 'sent' ? house.now().toISOString() : null,
		// A link that has gone out, or never will, must not lie about.
		...(state === 'waiting' ? {} : { sealed: null })
	});
	if (state === 'waiting') throw new Problem('unavailable', outcome.because ?? 'Try again later.');
}
