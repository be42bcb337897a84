/** A caption as it stands in its file: lines kept, seconds from the start of the film. */
export type CaptionCue = { startS: number; endS: number; text: string };

/** The lines of a cue as they are seen: no tags, entities as the one character that they show. */
export function visibleLines({ text }: CaptionCue): string[] {
	return text
		.replace(/<[^>]*>/g, '')
		.replace(/&(amp|lt|gt|nbsp|lrm|rlm);/g, (_, name: string) => (/rm$/.test(name) ? '' : '_'))
		.split(/\r?\n/)
		.map((line) => line.trim())
		.filter((line) => line !== '');
}

/**
 * Characters a second, spaces counted, the turn of a line not.
 *
 * Formula: n / t.
 * @throws RangeError where a cue lasts no time
 * Source: common practice of timed text.
 * @example charactersPerSecond({ startS: 0, endS: 2, text: 'Close the anvils.' }) // 8.5
 */
export function charactersPerSecond(cue: CaptionCue): number {
	return visibleLines(cue).reduce((sum, line) => sum + [...line].length, 0) / lengthS(cue);
}

/**
 * Words a minute; speaker names and sounds in brackets count, as they are read too.
 *
 * Formula: 60 · n / t.
 * @throws RangeError where a cue lasts no time
 * Source: BBC Subtitle Guidelines, section on timing; DCMP Captioning Key (what counts as a word).
 * @example wordsPerMinute({ startS: 0, endS: 1, text: 'Measure twice' }) // 120
 */
export function wordsPerMinute(cue: CaptionCue): number {
	const words = visibleLines(cue).flatMap((line) => line.split(/\s+/));
	return (60 * words.length) / lengthS(cue);
}

function lengthS({ startS, endS }: CaptionCue): number {
	if (!(endS > startS) || !Number.isFinite(endS - startS))
		throw new RangeError('a caption has a beginning and a later end');
	return endS - startS;
}
