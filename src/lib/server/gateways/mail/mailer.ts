import MailComposer from 'nodemailer/lib/mail-composer/index.js';
import SMTPConnection from 'nodemailer/lib/smtp-connection/index.js';
import shared from 'nodemailer/lib/shared/index.js';
import { Readable } from 'node:stream';
import { outcomeOf, type Delivery } from './delivery';

export type Letter = {
	/** The same at every try, so that a mailbox that got it twice can tell. */
	messageId: string;
	from: string;
	to: string;
	subject: string;
	text: string;
	html: string;
};

export type Mailer = {
	/** Never throws for what a server or a line does: each end has its outcome. */
	send: (letter: Letter) => Promise<Delivery>;
};

const waits = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000 };

/** @param smtpUrl smtp:// or smtps://, with user and password where the server wants them */
export function makeMailer({
	smtpUrl,
	timeouts = waits
}: {
	smtpUrl: string;
	timeouts?: typeof waits;
}): Mailer {
	const { auth, ...where } = shared.parseConnectionUrl(smtpUrl) as SMTPConnection.Options & {
		auth?: SMTPConnection.AuthenticationCredentials;
	};
	return {
		async send(letter) {
			const mime = new MailComposer({
				...letter,
				headers: { 'Auto-Submitted': 'auto-generated' },
				disableFileAccess: true,
				disableUrlAccess: true
			}).compile();
			const envelope = mime.getEnvelope();
			const bytes = await mime.build();
			if (!envelope.from || envelope.to.length !== 1)
				return { kind: 'refused', because: 'There is not one usable address.' };
			const connection = new SMTPConnection({ ...where, ...timeouts });
			return handOver(connection, auth, { from: envelope.from, to: envelope.to }, bytes);
		}
	};
}

/**
 * The line tells whether the letter's bytes had begun to leave: until the server asked for them
 * a broken line means "not sent", after that nobody can know. The transport on top of this
 * connection hides the difference, which is why it is not used.
 */
function handOver(
	connection: SMTPConnection,
	auth: SMTPConnection.AuthenticationCredentials | undefined,
	envelope: SMTPConnection.Envelope,
	bytes: Buffer
): Promise<Delivery> {
	return new Promise((resolve) => {
		let begun = false;
		let ended = false;
		const end = (error?: Error | null, response = '') => {
			if (ended) return;
			ended = true;
			const delivery: Delivery = error
				? outcomeOf(error, begun)
				: { kind: 'sent', response: response.slice(0, 200) };
			if (error) connection.close();
			else connection.quit();
			resolve(delivery);
		};
		async function* body() {
			begun = true; // asked for only once the server has said 354
			yield bytes;
		}
		const sendIt = () =>
			connection.send(envelope, Readable.from(body()), (error, info) => end(error, info?.response));
		connection.on('error', end);
		connection.once('end', () => end(new Error('The line was closed.')));
		connection.connect((error) => {
			if (error) end(error);
			else if (auth) connection.login(auth, (fault) => (fault ? end(fault) : sendIt()));
			else sendIt();
		});
	});
}
