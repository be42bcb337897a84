import { createServer } from 'node:http';
import { SMTPServer } from 'smtp-server';
import { closeNow, listenOnLoopback, portOf } from '../listen.js';
import { isAskedLocally, sendHtml, sendJson } from '../page.js';
import { mailStore } from './mail-store.js';
import { listPage, mailPage } from './mailbox-pages.js';

/**
 * @typedef {object} MailboxSettings
 * @property {number} smtpPort
 * @property {number} pagePort
 * @property {string} folder where the letters are kept
 */

/**
 * A mail server that delivers everything into one folder, with a page to read it. Two domains
 * behave as the world does: `…@refused.example` is refused for good, `…@busy.example` for now.
 * @param {MailboxSettings} settings ports may be 0
 */
export async function startFakeMailbox({ smtpPort, pagePort, folder }) {
	const store = mailStore(folder);
	const smtp = smtpServer(store);
	const pages = createServer((request, response) => {
		answer(store, request, response).catch((error) => {
			sendJson(response, 500, { error: String(error) });
		});
	});
	await listenOnLoopback(smtp.server, smtpPort);
	try {
		await listenOnLoopback(pages, pagePort);
	} catch (error) {
		await new Promise((resolve) => smtp.close(() => resolve(undefined)));
		throw error;
	}
	return {
		store,
		smtpPort: portOf(/** @type {any} */ (smtp.server)),
		pagePort: portOf(pages),
		async close() {
			await Promise.all([
				new Promise((resolve) => smtp.close(() => resolve(undefined))),
				closeNow(pages)
			]);
		}
	};
}

/** @param {ReturnType<typeof mailStore>} store */
function smtpServer(store) {
	const smtp = new SMTPServer({
		authOptional: true,
		disabledCommands: ['STARTTLS'],
		size: 10 * 1024 * 1024,
		closeTimeout: 1000,
		onAuth: (auth, session, done) => done(null, { user: auth.username }),
		onRcptTo({ address }, session, done) {
			const domain = address.split('@')[1]?.toLowerCase();
			if (domain === 'refused.example') return done(answerOf(550, 'No such mailbox here'));
			if (domain === 'busy.example') return done(answerOf(450, 'Mailbox busy, try again later'));
			done();
		},
		onData(stream, session, done) {
			/** @type {Buffer[]} */
			const parts = [];
			stream.on('data', (part) => parts.push(part));
			stream.on('end', () => {
				if (stream.sizeExceeded) return done(answerOf(552, 'Letter too large'));
				const { mailFrom, rcptTo } = session.envelope;
				const from = mailFrom ? mailFrom.address : '';
				try {
					store.keep(Buffer.concat(parts), { from, to: rcptTo.map((one) => one.address) });
					done();
				} catch (error) {
					done(answerOf(451, `Could not keep the letter: ${error}`));
				}
			});
		}
	});
	// A client that breaks its line off is no reason to end.
	smtp.on('error', () => {});
	return smtp;
}

/** @param {string} html */
function openingOutside(html) {
	const base = '<base target="_blank">';
	return /<head[^>]*>/i.test(html) ? html.replace(/<head[^>]*>/i, `$&${base}`) : base + html;
}

/** @param {number} responseCode @param {string} words */
const answerOf = (responseCode, words) => Object.assign(new Error(words), { responseCode });

/**
 * @param {ReturnType<typeof mailStore>} store
 * @param {import('node:http').IncomingMessage} request
 * @param {import('node:http').ServerResponse} response
 */
async function answer(store, request, response) {
	if (!isAskedLocally(request)) return sendJson(response, 403, { error: 'Ask for the loopback.' });
	const { pathname, searchParams } = new URL(request.url ?? '/', 'http://127.0.0.1');
	const to = searchParams.get('to');
	if (pathname === '/')
		return sendHtml(response, 200, listPage(await store.list({ to }), to), "form-action 'self'");
	if (pathname === '/messages') return sendJson(response, 200, await store.list({ to }));

	const [, id = '', form = ''] = /^\/messages\/(\d+)(\.eml|\/html|\.json)?$/.exec(pathname) ?? [];
	const mail = await store.one(id);
	if (!mail) return sendJson(response, 404, { error: 'No such letter.' });
	if (form === '.json') return sendJson(response, 200, mail);
	if (form === '.eml') {
		response.writeHead(200, { 'content-type': 'message/rfc822' });
		return void response.end(store.raw(id));
	}
	if (form === '/html') {
		// A letter is somebody else's page: no script, no address of ours, links open outside.
		const policy =
			"img-src data:; frame-ancestors 'self'; sandbox allow-popups allow-popups-to-escape-sandbox";
		return sendHtml(response, 200, openingOutside(mail.html), policy);
	}
	sendHtml(response, 200, mailPage(mail), "frame-src 'self'");
}
