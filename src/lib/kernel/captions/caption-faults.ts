import { dustS, found, type CaptionFault, type Found } from './caption-fault';
import { captionRules, type CaptionRules } from './caption-rules';
import { cueFaults } from './cue-faults';
import type { CaptionCue } from './reading-speed';

/**
 * What is wrong with the captions of a film, in their order.
 *
 * @param cues as they stand in the file, tags and line breaks kept
 * @param filmS length of the film in seconds, where it is known
 * Source: the limits of `captionRules`; the order of times, W3C WebVTT, 4.1.
 * @example captionFaults([{ startS: 1, endS: 1.4, text: 'Wipe the anvils' }])
 *   // too short, too fast (37.5 characters a second)
 */
export function captionFaults(
	cues: readonly CaptionCue[],
	filmS?: number,
	rules: CaptionRules = captionRules
): CaptionFault[] {
	if (cues.length === 0) return [{ cue: 0, ...found('no-cues', 'error', 'There is no caption.') }];
	const faults = cues.flatMap((cue, index) =>
		[...cueFaults(cue, rules), ...ofNeighbours(cues[index - 1], cue, rules)].map((fault) => ({
			cue: index + 1,
			...fault
		}))
	);
	const endS = Math.max(...cues.map((one) => one.endS).filter(Number.isFinite));
	if (filmS !== undefined && endS > filmS + rules.pastEndS + dustS)
		faults.push({
			cue: cues.findIndex((one) => one.endS === endS) + 1,
			...found('past-end', 'error', `It ends at ${endS} s, the film at ${filmS} s.`)
		});
	return faults;
}

function ofNeighbours(
	before: CaptionCue | undefined,
	cue: CaptionCue,
	rules: CaptionRules
): Found[] {
	const gapS = cue.startS - (before?.endS ?? 0);
	// A time that is no number is a fault of its own caption.
	if (!Number.isFinite(gapS)) return [];
	if (before && cue.startS < before.startS)
		return [found('order', 'error', 'It begins before the one above it.')];
	if (before && gapS < -dustS)
		return [found('overlap', 'warning', 'The one before it is still showing.')];
	if (before && gapS > dustS && gapS < rules.flickerS - dustS)
		return [found('gap', 'info', 'The gap before it flickers: close it, or open it.')];
	return gapS > rules.silenceS
		? [found('silence', 'info', `${gapS.toFixed(1)} s without a caption: is there sound in it?`)]
		: [];
}
