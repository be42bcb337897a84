import { blocksAsText } from './blocks';
import { blocksAsHtml } from './blocks-as-html';
import type { MailKind, MailSchool } from './kind';
import { awardDecided } from './kinds/award-decided';
import { awardWaiting } from './kinds/award-waiting';
import { certificateReady } from './kinds/certificate-ready';
import { certificateWithdrawn } from './kinds/certificate-withdrawn';
import { invitation } from './kinds/invitation';
import { newSignIn } from './kinds/new-sign-in';
import { passwordChanged } from './kinds/password-changed';
import { passwordReset } from './kinds/password-reset';
import { paymentReceived } from './kinds/payment-received';
import { roleInvitation } from './kinds/role-invitation';
import { signInLink } from './kinds/sign-in-link';
import { submissionMarked } from './kinds/submission-marked';

/** One line a kind. The contract test renders each. */
export const mailKinds = [
	signInLink,
	passwordReset,
	passwordChanged,
	newSignIn,
	invitation,
	roleInvitation,
	paymentReceived,
	submissionMarked,
	awardWaiting,
	awardDecided,
	certificateReady,
	certificateWithdrawn
] as const;

export type MailKindName = (typeof mailKinds)[number]['name'];
export type MailMessage = { subject: string; text: string; html: string };

/**
 * @param payload the stored payload and the opened one-time links together
 * @throws Error for an unknown kind or a payload that does not fit, naming fields, never values
 */
export function renderMail(name: string, payload: unknown, school?: MailSchool): MailMessage {
	const kind = mailKindNamed(name);
	const parsed = kind.payload.safeParse(payload);
	if (!parsed.success) {
		const fields = parsed.error.issues.map((one) => one.path.join('.'));
		throw new Error(`Mail ${name} lacks a usable ${fields.join(', ')}.`);
	}
	const subject = kind.subject(parsed.data, school);
	const from = school ? `${school.name}, by Ringland` : 'Ringland';
	const blocks = kind.body(parsed.data, school);
	return {
		subject,
		text: `${blocksAsText(blocks)}\n-- \n${from}\n`,
		html: blocksAsHtml(subject, from, blocks)
	};
}

export function mailKindNamed(name: string): MailKind {
	const found = mailKinds.find((kind) => kind.name === name);
	if (!found) throw new Error(`There is no mail kind ${name}.`);
	return found as unknown as MailKind;
}
