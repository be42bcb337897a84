declare module 'webvtt-parser' {
	type ParsedCue = { startTime: number; endTime: number; text: string; id: string };
	type ParseFault = { message: string; line: number; col: number };
	class WebVTTParser {
		parse(
			text: string,
			mode: 'metadata' | 'subtitles' | 'captions' | 'chapters'
		): { cues: ParsedCue[]; errors: ParseFault[]; time: number };
	}
	const module: { WebVTTParser: typeof WebVTTParser };
	export default module;
}
