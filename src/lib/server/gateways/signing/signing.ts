import {
	createPrivateKey,
	createPublicKey,
	generateKeyPairSync,
	randomBytes,
	sign,
	verify,
	type KeyObject
} from 'node:crypto';
import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { sha256Hex } from './digests';
import { keyFile } from './key-file';
import { makeSealing, type Sealing } from './sealing';

export type Signature = { keyId: string; signature: string };

export type Signing = Sealing & {
	/** Ed25519 over the bytes as they are; base64url. */
	sign: (bytes: Uint8Array) => Signature;
	/** Also for keys that were used before: what they signed stays checkable. */
	verify: (bytes: Uint8Array, signed: Signature) => boolean;
	/** Public keys as JWK (RFC 8037), by key id, for anyone who checks offline. */
	publicKeys: () => { kty: 'OKP'; crv: 'Ed25519'; x: string; kid: string }[];
};

/**
 * The newest `sign-*.pem` in `<dataDir>/keys` signs. Losing the folder loses what is sealed and
 * the right to sign as before: it belongs in the backup, away from the database.
 */
export async function openSigning(dataDir: string): Promise<Signing> {
	const folder = join(dataDir, 'keys');
	const master = await keyFile(join(folder, 'master.key'), () => randomBytes(32));
	const first = await keyFile(join(folder, 'sign-0001.pem'), () =>
		Buffer.from(generateKeyPairSync('ed25519').privateKey.export({ type: 'pkcs8', format: 'pem' }))
	);
	const later = (await readdir(folder)).filter((name) => /^sign-\d{4}\.pem$/.test(name)).sort();
	const pems = await Promise.all(later.map((name) => keyFile(join(folder, name), () => first)));
	const keys = pems.map((pem) => createPrivateKey(pem));
	const known = new Map(keys.map((key) => [keyIdOf(key), key]));
	const [currentId, current] = [...known].at(-1) ?? [];
	if (!current || !currentId) throw new Error(`There is no signing key in ${folder}.`);
	return {
		...makeSealing(master),
		sign: (bytes) => ({
			keyId: currentId,
			signature: sign(null, bytes, current).toString('base64url')
		}),
		verify(bytes, { keyId, signature }) {
			const key = known.get(keyId);
			return (
				key !== undefined &&
				verify(null, bytes, createPublicKey(key), Buffer.from(signature, 'base64url'))
			);
		},
		publicKeys: () =>
			[...known].map(([kid, key]) => ({ kty: 'OKP', crv: 'Ed25519', x: publicX(key), kid }))
	};
}

function publicX(key: KeyObject): string {
	const { x } = createPublicKey(key).export({ format: 'jwk' });
	if (!x) throw new Error('not an Ed25519 key');
	return x;
}

/** The thumbprint of RFC 7638: the same key has the same name everywhere. */
function keyIdOf(key: KeyObject): string {
	const canonical = JSON.stringify({ crv: 'Ed25519', kty: 'OKP', x: publicX(key) });
	return Buffer.from(sha256Hex(canonical), 'hex').toString('base64url');
}
