import { resolve } from 'node:path';
import { inProject } from './project.js';
import { Stop } from './say.js';
import { secretsIn } from './secrets.js';

/**
 * @typedef {object} Settings
 * @property {string} host
 * @property {number} port
 * @property {string} origin
 * @property {string} dataDir
 * @property {boolean} demo
 * @property {import('../../fakes/smtp/fake-mailbox.js').MailboxSettings | null} mailbox null where a real server sends
 * @property {import('../../fakes/stripe/fake-till.js').TillSettings | null} till null where the real one is paid at
 * @property {NodeJS.ProcessEnv} serverEnv
 */

/**
 * What the environment asks for. Only `src/lib/server/config/env.ts` reads it for the server;
 * this reads as much as is needed to start one.
 * @param {NodeJS.ProcessEnv} env
 * @param {{ smtp?: number, page?: number, till?: number }} [ports] of the fakes, next to the server's otherwise
 * @returns {Settings}
 */
export function settingsFrom(env, ports = {}) {
	const host = env.HOST || '127.0.0.1';
	const port = portFrom(env.PORT);
	const shown = host.includes(':') ? `[${host}]` : host;
	const origin = originFrom(env.ORIGIN || `http://${shown}:${port}`);
	const dataDir = resolve(inProject(), env.DATA_DIR || 'data');
	const secrets = secretsIn(dataDir);
	const mailbox = env.SMTP_URL
		? null
		: {
				smtpPort: ports.smtp ?? port + 1,
				pagePort: ports.page ?? port + 2,
				folder: resolve(dataDir, 'mailbox')
			};
	const till = env.STRIPE_SECRET_KEY
		? null
		: {
				port: ports.till ?? port + 3,
				secretKey: secrets.stripeSecretKey,
				webhookSecret: secrets.stripeWebhookSecret,
				webhookUrl: `http://${reachable(host)}:${port}/api/v1/stripe/webhook`,
				webhookHost: new URL(origin).host,
				stateFile: resolve(dataDir, 'till.json')
			};
	return {
		host,
		port,
		origin,
		dataDir,
		demo: env.DEMO !== 'off',
		mailbox,
		till,
		serverEnv: {
			...env,
			HOST: host,
			PORT: String(port),
			ORIGIN: origin,
			DATA_DIR: dataDir,
			NODE_ENV: 'production',
			AUTH_SECRET: env.AUTH_SECRET || secrets.authSecret,
			// Each route has its own limit in a handle; the adapter's is one for all.
			BODY_SIZE_LIMIT: 'Infinity',
			SHUTDOWN_TIMEOUT: env.SHUTDOWN_TIMEOUT || '5',
			// Image work and waiting transactions share these threads with database reads.
			UV_THREADPOOL_SIZE: env.UV_THREADPOOL_SIZE || '16',
			...(mailbox && {
				SMTP_URL: `smtp://127.0.0.1:${mailbox.smtpPort}`,
				MAILBOX_URL: `http://127.0.0.1:${mailbox.pagePort}`
			}),
			...(till && {
				STRIPE_SECRET_KEY: till.secretKey,
				STRIPE_WEBHOOK_SECRET: till.webhookSecret,
				STRIPE_API_BASE: `http://127.0.0.1:${till.port}`,
				TILL_ORIGIN: `http://127.0.0.1:${till.port}`
			})
		}
	};
}

/** Where this machine reaches a server that listens there. @param {string} host */
export function reachable(host) {
	if (host === '0.0.0.0') return '127.0.0.1';
	if (host === '::') return '[::1]';
	return host.includes(':') ? `[${host}]` : host;
}

/** @param {string | undefined} text */
function portFrom(text) {
	const port = text ? Number(text) : 4180;
	if (!Number.isInteger(port) || port < 1 || port > 65_532)
		throw new Stop(`PORT must be a whole number from 1 to 65532, not "${text}".`);
	return port;
}

/** @param {string} text */
function originFrom(text) {
	if (!URL.canParse(text) || !/^https?:/.test(text))
		throw new Stop(`ORIGIN must be an address such as https://ringland.example, not "${text}".`);
	return new URL(text).origin;
}
