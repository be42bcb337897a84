import { randomBytes } from 'node:crypto';
import {
	chmodSync,
	existsSync,
	linkSync,
	mkdirSync,
	readFileSync,
	rmSync,
	writeFileSync
} from 'node:fs';
import { join } from 'node:path';

/**
 * @typedef {object} Secrets
 * @property {string} authSecret
 * @property {string} stripeSecretKey of the stand-in till
 * @property {string} stripeWebhookSecret of the stand-in till
 */

/**
 * The secrets that nobody set, made on the first start and kept under the data folder. Written
 * aside and linked, so that two first starts end with one file.
 * @param {string} dataDir
 * @returns {Secrets}
 */
export function secretsIn(dataDir) {
	const file = join(dataDir, 'secrets.json');
	mkdirSync(dataDir, { recursive: true, mode: 0o700 });
	if (!existsSync(file)) {
		const aside = join(dataDir, `.secrets-${process.pid}`);
		writeFileSync(aside, JSON.stringify(freshSecrets(), null, '\t'), { mode: 0o600 });
		try {
			linkSync(aside, file);
		} catch (error) {
			if (!existsSync(file)) throw error;
		}
		rmSync(aside);
	}
	chmodSync(file, 0o600);
	return JSON.parse(readFileSync(file, 'utf8'));
}

/** @returns {Secrets} */
function freshSecrets() {
	const chance = () => randomBytes(32).toString('base64url');
	return {
		authSecret: chance(),
		stripeSecretKey: `sk_test_standin_${randomBytes(16).toString('hex')}`,
		stripeWebhookSecret: `whsec_${randomBytes(24).toString('hex')}`
	};
}
