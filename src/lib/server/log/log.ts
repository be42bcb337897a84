import pino, { type Logger } from 'pino';

export type Log = Logger;

/** Tokens, passwords and codes never reach the log, whatever object carries them. */
const secretPaths = ['password', 'token', 'secret', 'cookie', 'authorization', 'link', 'key'];

export function makeLog(level: string): Log {
	return pino({
		level,
		base: undefined,
		redact: {
			paths: secretPaths.flatMap((name) => [name, `*.${name}`, `*.*.${name}`]),
			censor: '[kept out]'
		}
	});
}
