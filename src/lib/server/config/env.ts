import { z } from 'zod';

const flag = z.enum(['on', 'off']);
const optionalText = z
	.string()
	.trim()
	.transform((text) => (text === '' ? undefined : text))
	.optional();

/**
 * The whole environment, read in one place. DEVELOPERS.md prints this table and a test holds
 * the two together. `HOST` and `PORT` are adapter-node's own names.
 */
const schema = z.object({
	HOST: z.string().default('127.0.0.1'),
	PORT: z.coerce.number().int().min(0).max(65535).default(4180),
	ORIGIN: optionalText.pipe(z.url().optional()),
	DATA_DIR: z.string().default('./data'),
	DEMO: flag.default('on'),
	WORKER: flag.default('on'),
	LOG_LEVEL: z.enum(['trace', 'debug', 'info', 'warn', 'error', 'silent']).default('info'),
	AUTH_SECRET: optionalText,
	SMTP_URL: optionalText,
	MAIL_FROM: z.string().default('Ringland <no-reply@ringland.example>'),
	STRIPE_SECRET_KEY: optionalText,
	STRIPE_WEBHOOK_SECRET: optionalText,
	STRIPE_API_BASE: optionalText.pipe(z.url().optional()),
	TILL_ORIGIN: z.string().default('https://checkout.stripe.com'),
	MAILBOX_URL: optionalText.pipe(z.url().optional()),
	ADDRESS_HEADER: optionalText,
	XFF_DEPTH: z.coerce.number().int().min(1).default(1)
});

export const environmentKeys = Object.keys(schema.shape);

export type Config = Omit<z.infer<typeof schema>, 'ORIGIN'> & { ORIGIN: string };

/** @throws Error naming every key that is wrong, so that a start fails with one readable message. */
export function readEnvironment(source: NodeJS.ProcessEnv = process.env): Config {
	const parsed = schema.safeParse(source);
	if (!parsed.success) {
		const faults = parsed.error.issues.map((one) => `${one.path.join('.')}: ${one.message}`);
		throw new Error(`The environment is not usable:\n  ${faults.join('\n  ')}`);
	}
	const { ORIGIN, ...rest } = parsed.data;
	const host = rest.HOST.includes(':') ? `[${rest.HOST}]` : rest.HOST;
	return { ...rest, ORIGIN: new URL(ORIGIN ?? `http://${host}:${rest.PORT}`).origin };
}

export function isLoopback(origin: string): boolean {
	const { hostname } = new URL(origin);
	return /^(localhost|127(\.\d{1,3}){3}|\[::1\])$/.test(hostname);
}
