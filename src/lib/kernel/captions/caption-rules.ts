/** Limits that a caption file is held to. House styles differ; these can be given anew. */
export type CaptionRules = {
	leastS: number;
	mostS: number;
	charactersPerSecond: number;
	/** Above this it is an error, not a warning: nobody reads that. */
	hardCharactersPerSecond: number;
	wordsPerMinute: number;
	charactersPerLine: number;
	lines: number;
	hardLines: number;
	/** A gap shorter than this flickers: close it, or open it so far. */
	flickerS: number;
	/** A silence longer than this is looked at by a person: is there sound in it? */
	silenceS: number;
	/** Captions may end this long after the film. */
	pastEndS: number;
};

/**
 * What Ringland's own films are held to.
 * Source: BBC Subtitle Guidelines (160 to 180 words a minute, two lines, 0.3 s a word), 47 CFR
 * 15.122 (42 characters a row), common practice of timed text (20 characters a second, 7 s at most).
 */
export const captionRules: CaptionRules = {
	leastS: 0.8,
	mostS: 7,
	charactersPerSecond: 20,
	hardCharactersPerSecond: 25,
	wordsPerMinute: 180,
	charactersPerLine: 42,
	lines: 2,
	hardLines: 3,
	flickerS: 0.08,
	silenceS: 10,
	pastEndS: 0.5
};
