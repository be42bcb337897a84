import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import pkg from 'webvtt-parser';
import { captionFaults } from '$lib/kernel/captions/caption-faults';
import {
	charactersPerSecond,
	visibleLines,
	wordsPerMinute,
	type CaptionCue
} from '$lib/kernel/captions/reading-speed';
import { expectWithin, referenceOf } from '../../support/reference';

const cue = (startS: number, endS: number, text = 'Wipe the anvils first.'): CaptionCue => ({
	startS,
	endS,
	text
});
const rulesOf = (cues: CaptionCue[], filmS?: number) =>
	captionFaults(cues, filmS).map(({ cue: n, rule, level }) => `${n} ${rule} ${level}`);

describe('reading speed, published sums', () => {
	type Entry = { characters?: number; words?: number; seconds: number };
	it.each(referenceOf<Entry>('caption-speed.json'))('%s', (_, entry) => {
		const { characters, words = 0, seconds } = entry;
		const found = characters
			? charactersPerSecond(cue(0, seconds, 'x'.repeat(characters)))
			: wordsPerMinute(cue(0, seconds, Array(words).fill('oil').join(' ')));
		expectWithin(found, entry);
	});
	it('counts what is seen, not tags and entities', () => {
		expect(visibleLines(cue(0, 1, '<v Ines>Nuts &amp; <i>bolts</i>\n\n every\u00a0one '))).toEqual([
			'Nuts _ bolts',
			'every\u00a0one'
		]);
		expect(charactersPerSecond(cue(0, 2, '<b>12</b>\n34'))).toBe(2);
		expect(() => wordsPerMinute(cue(2, 2))).toThrow(RangeError);
	});
});

describe('a caption file', () => {
	it('without fault has none', () => {
		expect(rulesOf([cue(1, 3), cue(3, 5), cue(5.2, 7)], 8)).toEqual([]);
	});
	it.each<[string, CaptionCue[], string[]]>([
		['no caption', [], ['0 no-cues error']],
		['ends before it begins', [cue(2, 1)], ['1 end-after-start error']],
		['no time is a number', [cue(Number.NaN, 1)], ['1 end-after-start error']],
		['out of order', [cue(5, 7), cue(1, 3)], ['2 order error']],
		['overlap', [cue(1, 3), cue(2.9, 5)], ['2 overlap warning']],
		['tags alone', [cue(1, 3, '<i> </i>')], ['1 empty-cue error']],
		['too short', [cue(1, 1.5, 'Now')], ['1 min-duration warning']],
		['0.8 s is long enough', [cue(1.1, 1.9, 'Now')], []],
		['too long', [cue(1, 8.5)], ['1 max-duration warning']],
		['21 characters a second', [cue(1, 3, 'a'.repeat(42))], ['1 reading-speed warning']],
		['20 characters a second', [cue(1, 3, 'a'.repeat(40))], []],
		['26 characters a second', [cue(1, 2.5, 'a'.repeat(39))], ['1 reading-speed error']],
		['many short words', [cue(1, 3, 'so it is as we do it')], ['1 reading-speed warning']],
		['a line of 43', [cue(1, 5, 'a'.repeat(43))], ['1 line-length warning']],
		['three lines', [cue(1, 5, 'a\nb\nc')], ['1 line-count warning']],
		['four lines', [cue(1, 5, 'a\nb\nc\nd')], ['1 line-count error']],
		['a gap that flickers', [cue(1, 3), cue(3.04, 5)], ['2 gap info']],
		['a gap of 80 ms', [cue(1, 3), cue(3.08, 5)], []],
		['a long silence', [cue(1, 3), cue(14, 16)], ['2 silence info']],
		['a late beginning', [cue(11, 13)], ['1 silence info']]
	])('with %s', (_, cues, wanted) => {
		expect(rulesOf(cues)).toEqual(wanted);
	});
	it('does not run past its film, by more than half a second', () => {
		expect(rulesOf([cue(1, 3)], 2.5)).toEqual([]);
		expect(rulesOf([cue(1, 3)], 2.4)).toEqual(['1 past-end error']);
	});
	it('is read to the end whatever is in it', () => {
		const any = fc.record({ startS: fc.double(), endS: fc.double(), text: fc.string() });
		fc.assert(
			fc.property(fc.array(any), (cues) => {
				for (const fault of captionFaults(cues, 10)) expect(fault.says).not.toMatch(/NaN|Infinity/);
			})
		);
	});
});

describe('the films of this product', () => {
	const lessons = join(import.meta.dirname, '../../../lessons');
	const files = readdirSync(lessons, { recursive: true, encoding: 'utf8' }).filter((path) =>
		path.endsWith('captions.en.vtt')
	);
	it('have captions to look at', () => expect(files.length).toBeGreaterThanOrEqual(2));
	it.each(files)('%s has no error and no warning', (path) => {
		const text = readFileSync(join(lessons, path), 'utf8');
		const { cues } = new pkg.WebVTTParser().parse(text, 'metadata');
		const faults = captionFaults(
			cues.map(({ startTime, endTime, text: said }) => ({
				startS: startTime,
				endS: endTime,
				text: said
			}))
		);
		expect(faults.filter(({ level }) => level !== 'info')).toEqual([]);
	});
});
