import pkg from 'webvtt-parser';
import type { Cue } from '$lib/domain/courses/lesson';
import { ContentFault } from './fault';

const { WebVTTParser } = pkg;

/** Cues of a WebVTT file. Any fault that the parser names is a fault of the lesson. */
export function readCues(file: string, text: string): Cue[] {
	const { cues, errors } = new WebVTTParser().parse(text, 'metadata');
	const [first] = errors;
	if (first) throw new ContentFault(file, first.message, first.line);
	if (cues.length === 0) throw new ContentFault(file, 'there is no cue in it');
	return cues.map((cue) => ({
		startS: cue.startTime,
		endS: cue.endTime,
		text: cue.text
			.replace(/<[^>]+>/g, '')
			.replace(/\s+/g, ' ')
			.trim()
	}));
}
