import { mails } from '../models';
import { find, insert, select, update } from '../rows';
import { acrossSchools, type Scope } from '../scope';
import { enqueueJob } from './jobs';

export type NewMail = {
	kind: string;
	to: string;
	payload: Record<string, unknown>;
	/** One-time links by their field name. They are sealed here and open only while sending. */
	links?: Record<string, string>;
	schoolId?: string;
};

/** The one thing that is needed of the signing gateway, so that this layer does not know it. */
export type Sealer = { seal: (secret: string, about: string) => string };

export async function enqueueMail(
	scope: Scope,
	sealer: Sealer,
	mail: NewMail,
	newId: () => string,
	at: Date
): Promise<void> {
	const id = newId();
	await insert(acrossSchools(scope), mails, {
		id,
		schoolId: mail.schoolId ?? (scope.kind === 'school' ? scope.schoolId : null),
		kind: mail.kind,
		recipient: mail.to,
		payload: mail.payload,
		sealed: mail.links ? sealer.seal(JSON.stringify(mail.links), id) : null,
		messageId: `<${id.toLowerCase()}@ringland.example>`,
		state: 'waiting',
		attempts: 0,
		createdAt: at.toISOString(),
		sentAt: null,
		fault: null
	});
	await enqueueJob(scope, { kind: 'send-mail', payload: { mailId: id } }, newId(), at);
}

export function findMail(scope: Scope, id: string) {
	return find(acrossSchools(scope), mails, { id });
}

type MailChange = Parameters<typeof update<typeof mails>>[3];

export function changeMail(scope: Scope, id: string, change: MailChange) {
	return update(acrossSchools(scope), mails, { id }, change);
}

export function mailsOfSchool(scope: Scope, schoolId: string, limit = 100) {
	return select(
		acrossSchools(scope),
		mails,
		{ schoolId },
		{ order: [['createdAt', 'desc']], limit }
	);
}
