import { hash, verify } from '@node-rs/argon2';

/** OWASP's first choice for argon2id: 19 MiB, two passes, one lane. */
const strength = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export function hashPassword(password: string): Promise<string> {
	return hash(password, strength);
}

/** Takes as long when there is no account, so that the time tells nothing. */
export async function verifyPassword(kept: string | null, password: string): Promise<boolean> {
	if (kept === null) {
		await hash(password, strength);
		return false;
	}
	return verify(kept, password);
}
