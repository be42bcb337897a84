import fc from 'fast-check';
import { expect, it } from 'vitest';
import { certificateCode, readCertificateCode } from '$lib/domain/certificates/code';

const codes = fc.uint8Array({ minLength: 7, maxLength: 7 }).map(certificateCode);
const alphabet = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

it('has one form and is read back from every way of typing it', () => {
	fc.assert(
		fc.property(codes, (code) => {
			expect(code).toMatch(/^RL(-[0-9A-HJKMNP-TV-Z]{4}){3}$/);
			for (const typed of [
				code,
				code.toLowerCase(),
				code.slice(3),
				code.replaceAll('-', ' '),
				code.replaceAll('-', ''),
				code.slice(3).replaceAll('0', 'o').replaceAll('1', 'l'),
				` ${code.replaceAll('1', 'I')} `
			])
				expect(readCertificateCode(typed)).toBe(code);
		})
	);
});

it('notices every single wrong character and every two that changed places', () => {
	fc.assert(
		fc.property(
			codes,
			fc.nat(11),
			fc.nat(11),
			fc.constantFrom(...alphabet),
			(code, i, j, wrong) => {
				const body = [...code.replace('RL', '').replaceAll('-', '')];
				const changed = body.with(i, wrong);
				if (changed.join() !== body.join())
					expect(readCertificateCode(changed.join(''))).toBeNull();
				const swapped = body.with(i, body[j] ?? '').with(j, body[i] ?? '');
				if (swapped.join() !== body.join())
					expect(readCertificateCode(swapped.join(''))).toBeNull();
			}
		),
		{ numRuns: 2000 }
	);
});

it('spreads over all characters', () => {
	const seen = new Set(
		fc.sample(codes, 400).flatMap((code) => [...code.slice(3).replaceAll('-', '')])
	);
	expect(seen.size).toBe(32);
});

it.each([
	'',
	'RL',
	'RL-UUUU-UUUU-UUUU',
	'RL-0000-0000-000',
	'RL-0000-0000-00000',
	'RL-0000-0000-0001'
])('takes %j for no code', (typed) => expect(readCertificateCode(typed)).toBeNull());
