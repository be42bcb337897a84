import fc from 'fast-check';
import { expect, it } from 'vitest';
import {
	readTag,
	readTagQr,
	tagCode,
	tagFound,
	tagQrText,
	tagWords
} from '$lib/domain/job-sheets/evidence-tag';

const codes = fc.uint8Array({ minLength: 10, maxLength: 10 }).map(tagCode);

it('carries all 80 bits in sixteen characters', () => {
	expect(tagCode(new Uint8Array(10))).toBe('0000000000000000');
	expect(tagCode(new Uint8Array(10).fill(255))).toBe('ZZZZZZZZZZZZZZZZ');
	expect(() => tagCode(new Uint8Array(9))).toThrow(RangeError);
});

it('is read back from print, from a screen and from typing', () => {
	fc.assert(
		fc.property(codes, (code) => {
			expect(tagWords(code)).toMatch(/^.{4}-.{4}-.{4}-.{4}$/);
			expect(readTagQr(tagQrText(code))).toBe(code);
			expect(readTag(tagWords(code).toLowerCase())).toBe(code);
			expect(readTag(code.replaceAll('0', 'O').replaceAll('1', 'l'))).toBe(code);
		})
	);
});

it.each([
	'https://poster.example',
	'RLT2:9FQ47K2MX0AB3DZW',
	'RLT1:9FQ4',
	'RLT1:9FQ47K2MX0AB3DZU',
	''
])('takes %j for another code', (text) => expect(readTagQr(text)).toBeNull());

it('knows the attempt’s own tag beside a partner’s', () => {
	expect(tagFound('A', ['B', 'A'])).toBe('this-attempt');
	expect(tagFound('A', ['B'])).toBe('another');
	expect(tagFound('A', [])).toBe('none');
});
