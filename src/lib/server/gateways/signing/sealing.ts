import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto';

export type Sealing = {
	/** @param about what it belongs to (a job's id): it opens under the same words alone */
	seal: (secret: string, about: string) => string;
	/** @throws Error where it was changed, sealed with another key, or belongs elsewhere */
	open: (sealed: string, about: string) => string;
	/** A key for one purpose, the same at each start: session marks, known devices, addresses. */
	keyFor: (purpose: string) => Uint8Array;
};

const version = 'v1';

/**
 * AES-256-GCM with a fresh 96-bit nonce each time. Written as `v1.<nonce>.<tag>.<text>`, each
 * part in base64url. For secrets that must be used later: a link's token waiting in a mail job.
 */
export function makeSealing(master: Uint8Array): Sealing {
	if (master.length < 32) throw new RangeError('the master key has at least 32 bytes');
	const keyFor = (purpose: string) =>
		new Uint8Array(hkdfSync('sha256', master, new Uint8Array(0), `ringland/${purpose}`, 32));
	const key = keyFor('sealing');
	return {
		keyFor,
		seal(secret, about) {
			const nonce = randomBytes(12);
			const cipher = createCipheriv('aes-256-gcm', key, nonce).setAAD(Buffer.from(about));
			const text = Buffer.concat([cipher.update(secret, 'utf8'), cipher.final()]);
			const parts = [nonce, cipher.getAuthTag(), text].map((one) => one.toString('base64url'));
			return [version, ...parts].join('.');
		},
		open(sealed, about) {
			const [kind, nonce, tag, text] = sealed.split('.');
			if (kind !== version || !nonce || !tag || text === undefined)
				throw new Error('This is no sealed secret.');
			const bytes = (part: string) => Buffer.from(part, 'base64url');
			const decipher = createDecipheriv('aes-256-gcm', key, bytes(nonce), { authTagLength: 16 })
				.setAAD(Buffer.from(about))
				.setAuthTag(bytes(tag));
			return decipher.update(bytes(text), undefined, 'utf8') + decipher.final('utf8');
		}
	};
}
