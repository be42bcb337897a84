import { createPublicKey, verify } from 'node:crypto';
import { cp, mkdtemp, readdir, rename, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { hmacHex, sameDigest, sha256Hex } from '$lib/server/gateways/signing/digests';
import { openSigning } from '$lib/server/gateways/signing/signing';

let dataDir = '';
beforeEach(async () => {
	dataDir = await mkdtemp(join(tmpdir(), 'ringland-signing-'));
});
afterEach(() => rm(dataDir, { recursive: true }));

const words = Buffer.from('head 812 of the ledger');

it('makes keys once, for this account alone, even when two start together', async () => {
	const [one, other] = await Promise.all([openSigning(dataDir), openSigning(dataDir)]);
	expect(other.verify(words, one.sign(words))).toBe(true);
	expect(one.open(other.seal('token', 'job 1'), 'job 1')).toBe('token');
	expect(await readdir(join(dataDir, 'keys'))).toEqual(['master.key', 'sign-0001.pem']);
	for (const name of await readdir(join(dataDir, 'keys')))
		expect((await stat(join(dataDir, 'keys', name))).mode & 0o777).toBe(0o600);
	const again = await openSigning(dataDir);
	expect(again.sign(words)).toEqual(one.sign(words));
});

it('signs so that anyone with the public key can check, and nothing else passes', async () => {
	const signing = await openSigning(dataDir);
	const signed = signing.sign(words);
	const [jwk] = signing.publicKeys();
	expect(jwk?.kid).toBe(signed.keyId);
	const outside = createPublicKey({ key: { ...jwk }, format: 'jwk' });
	expect(verify(null, words, outside, Buffer.from(signed.signature, 'base64url'))).toBe(true);
	expect(signing.verify(Buffer.from('head 811 of the ledger'), signed)).toBe(false);
	expect(signing.verify(words, { ...signed, keyId: 'other' })).toBe(false);
});

it('signs with the newest key and still knows the older one', async () => {
	const before = (await openSigning(dataDir)).sign(words);
	const elsewhere = await mkdtemp(join(tmpdir(), 'ringland-signing-'));
	await openSigning(elsewhere);
	await rename(join(elsewhere, 'keys/sign-0001.pem'), join(elsewhere, 'keys/sign-0002.pem'));
	await cp(join(elsewhere, 'keys/sign-0002.pem'), join(dataDir, 'keys/sign-0002.pem'));
	await rm(elsewhere, { recursive: true });
	const signing = await openSigning(dataDir);
	expect(signing.sign(words).keyId).not.toBe(before.keyId);
	expect(signing.verify(words, before)).toBe(true);
});

it('opens what it sealed for the same purpose, and nothing that was touched', async () => {
	const signing = await openSigning(dataDir);
	const sealed = signing.seal('https://ringland.example/x#tøken', 'job 7');
	expect(sealed).not.toContain('tøken');
	expect(signing.seal('https://ringland.example/x#tøken', 'job 7')).not.toBe(sealed);
	expect(signing.open(sealed, 'job 7')).toBe('https://ringland.example/x#tøken');
	expect(() => signing.open(sealed, 'job 8')).toThrow();
	expect(() =>
		signing.open(
			sealed.replace(/.$/, (last) => (last === 'A' ? 'B' : 'A')),
			'job 7'
		)
	).toThrow();
	expect(() => signing.open('v1.a.b', 'job 7')).toThrow();
});

// FIPS 180-2 appendix B.1; RFC 4231 test case 2.
it('hashes as published', () => {
	expect(sha256Hex('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
	expect(hmacHex(Buffer.from('Jefe'), 'what do ya want for nothing?')).toBe(
		'5bdcc146bf60754e6a042426089575c75a003f089d2739839dec58b964ec3843'
	);
	expect(sameDigest('ab', 'ab')).toBe(true);
	expect(sameDigest('ab', 'ac')).toBe(false);
	expect(sameDigest('ab', 'abc')).toBe(false);
});
