import type { Formula } from '../formula';
import { charactersPerSecond, wordsPerMinute } from './reading-speed';

const cue = { startS: 0, endS: 2, text: 'Close the anvils.' };

export const captionFormulas: readonly Formula[] = [
	{
		id: 'captions/characters-per-second',
		works: charactersPerSecond,
		formula: 'n / t',
		source: 'common practice of timed text',
		example: {
			says: '“Close the anvils.” for 2 s',
			gives: () => charactersPerSecond(cue),
			wanted: 8.5,
			within: 1e-9
		}
	},
	{
		id: 'captions/words-per-minute',
		works: wordsPerMinute,
		formula: '60 · n / t',
		source: 'BBC Subtitle Guidelines; DCMP Captioning Key (what counts as a word)',
		example: {
			says: '“Close the anvils.” for 2 s',
			gives: () => wordsPerMinute(cue),
			wanted: 90,
			within: 1e-9
		}
	}
];
