export type CaptionFaultName =
	| 'no-cues'
	| 'end-after-start'
	| 'order'
	| 'overlap'
	| 'past-end'
	| 'empty-cue'
	| 'min-duration'
	| 'max-duration'
	| 'reading-speed'
	| 'line-length'
	| 'line-count'
	| 'gap'
	| 'silence';
export type CaptionFault = {
	rule: CaptionFaultName;
	level: 'error' | 'warning' | 'info';
	/** Which caption, counted from 1; 0 for the file as a whole. */
	cue: number;
	says: string;
};

/** A fault before it is known which caption has it. */
export type Found = Omit<CaptionFault, 'cue'>;
export const found = (
	rule: CaptionFaultName,
	level: CaptionFault['level'],
	says: string
): Found => ({
	rule,
	level,
	says
});

/** Times in a file have milliseconds; differences of them carry binary dust below that. */
export const dustS = 1e-6;
