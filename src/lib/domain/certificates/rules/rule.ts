import type { Evidence } from '../evidence';

export type Verdict = {
	met: boolean;
	/** What the award stands on: page, PDF and credential print these lines. */
	because: string[];
	/** What is still to be done, in the words of the trade. Empty when it is met. */
	missing: string[];
};

/** A published version never changes: a correction is a new version beside it. */
export type AwardRule = {
	key: string;
	version: number;
	/** The rule itself, for the course page, the verifier and the certificate. */
	words: string;
	decide: (evidence: Evidence) => Verdict;
};
