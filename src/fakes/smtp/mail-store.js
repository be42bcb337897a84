import {
	closeSync,
	existsSync,
	fsyncSync,
	mkdirSync,
	openSync,
	readdirSync,
	readFileSync,
	renameSync,
	writeFileSync
} from 'node:fs';
import { join } from 'node:path';
import { simpleParser } from 'mailparser';

/**
 * @typedef {object} StoredMail
 * @property {string} id
 * @property {string} at when it was taken in
 * @property {string[]} to the addresses it was delivered to
 * @property {string} from
 * @property {string} subject
 * @property {string | null} messageId
 * @property {string} text
 * @property {string} html
 * @property {string[]} links every address in its text, in order
 */

/**
 * One .eml file a letter, so that a restart keeps them and any mail program opens them. The
 * envelope is written in front as a delivering server would.
 * @param {string} folder
 */
export function mailStore(folder) {
	mkdirSync(folder, { recursive: true, mode: 0o700 });
	/** @type {Map<string, Promise<StoredMail>>} */
	const parsed = new Map();
	let last = 0;

	/** @param {string} id */
	function read(id) {
		const found = parsed.get(id);
		if (found) return found;
		const mail = parse(id, readFileSync(join(folder, `${id}.eml`)));
		parsed.set(id, mail);
		return mail;
	}

	return {
		/**
		 * On disk before it returns: the server may say that it has the letter.
		 * @param {Buffer} raw
		 * @param {{ from: string, to: string[] }} envelope
		 */
		keep(raw, envelope) {
			last = Math.max(Date.now(), last + 1);
			const id = String(last);
			const head = [
				`Return-Path: <${envelope.from}>`,
				...envelope.to.map((to) => `Delivered-To: ${to}`)
			];
			const aside = join(folder, `.${id}`);
			const file = openSync(aside, 'wx', 0o600);
			writeFileSync(file, Buffer.concat([Buffer.from(`${head.join('\r\n')}\r\n`), raw]));
			fsyncSync(file);
			closeSync(file);
			renameSync(aside, join(folder, `${id}.eml`));
			return id;
		},
		/** @param {string} id */
		raw(id) {
			const file = join(folder, `${id}.eml`);
			return /^\d+$/.test(id) && existsSync(file) ? readFileSync(file) : null;
		},
		/** @param {string} id */
		async one(id) {
			return this.raw(id) ? read(id) : null;
		},
		/**
		 * Newest first.
		 * @param {{ to?: string | null }} [wanted]
		 */
		async list({ to } = {}) {
			const ids = readdirSync(folder)
				.flatMap((name) => /^(\d+)\.eml$/.exec(name)?.[1] ?? [])
				.sort((a, b) => Number(b) - Number(a));
			const mails = await Promise.all(ids.map(read));
			return to ? mails.filter((one) => one.to.includes(to.toLowerCase())) : mails;
		}
	};
}

/**
 * @param {string} id
 * @param {Buffer} raw
 * @returns {Promise<StoredMail>}
 */
async function parse(id, raw) {
	const mail = await simpleParser(raw, { skipImageLinks: true, skipTextToHtml: true });
	const text = mail.text ?? '';
	const to = mail.headerLines
		.filter((one) => one.key === 'delivered-to')
		.map((one) => one.line.slice('Delivered-To: '.length).trim().toLowerCase());
	return {
		id,
		at: new Date(Number(id)).toISOString(),
		to,
		from: mail.from?.text ?? '',
		subject: mail.subject ?? '',
		messageId: mail.messageId ?? null,
		text,
		html: typeof mail.html === 'string' ? mail.html : '',
		links: text.match(/https?:\/\/[^\s<>"')\]]+/g) ?? []
	};
}
