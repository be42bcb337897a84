import { dustS, found, type CaptionFault, type Found } from './caption-fault';
import type { CaptionRules } from './caption-rules';
import {
	charactersPerSecond,
	visibleLines,
	wordsPerMinute,
	type CaptionCue
} from './reading-speed';

/** What is wrong with one caption by itself. */
export function cueFaults(cue: CaptionCue, rules: CaptionRules): Found[] {
	return [...ofTime(cue, rules), ...ofText(cue, rules)];
}

function ofTime(cue: CaptionCue, rules: CaptionRules): Found[] {
	const lengthS = cue.endS - cue.startS;
	if (!lasts(cue)) return [found('end-after-start', 'error', 'It must end after it begins.')];
	if (lengthS < rules.leastS - dustS)
		return [found('min-duration', 'warning', `It stands for less than ${rules.leastS} s.`)];
	if (lengthS > rules.mostS + dustS)
		return [found('max-duration', 'warning', `It stands for more than ${rules.mostS} s.`)];
	return [];
}

function ofText(cue: CaptionCue, rules: CaptionRules): Found[] {
	const lines = visibleLines(cue);
	if (lines.length === 0) return [found('empty-cue', 'error', 'There is no text in it.')];
	const out: Found[] = [];
	if (lines.length > rules.lines)
		out.push(
			found(
				'line-count',
				lines.length > rules.hardLines ? 'error' : 'warning',
				`${lines.length} lines; at most ${rules.lines}.`
			)
		);
	const widest = Math.max(...lines.map((line) => [...line].length));
	if (widest > rules.charactersPerLine)
		out.push(
			found(
				'line-length',
				'warning',
				`A line of ${widest} characters; at most ${rules.charactersPerLine}.`
			)
		);
	return [...out, ...ofSpeed(cue, rules)];
}

function ofSpeed(cue: CaptionCue, rules: CaptionRules): Found[] {
	// A cue that lasts no time is reported as that.
	if (!lasts(cue)) return [];
	const [characters, words] = [charactersPerSecond(cue), wordsPerMinute(cue)];
	const fast = (level: CaptionFault['level'], says: string) => [
		found('reading-speed', level, `${says}: give it more time or fewer words.`)
	];
	if (characters > rules.charactersPerSecond + dustS)
		return fast(
			characters > rules.hardCharactersPerSecond + dustS ? 'error' : 'warning',
			`${characters.toFixed(1)} characters a second`
		);
	return words > rules.wordsPerMinute + dustS
		? fast('warning', `${Math.round(words)} words a minute`)
		: [];
}

/** A file tells times to the millisecond; what is shorter than one lasts no time. */
function lasts({ startS, endS }: CaptionCue): boolean {
	return Number.isFinite(endS - startS) && endS - startS > 0.001 - dustS;
}
