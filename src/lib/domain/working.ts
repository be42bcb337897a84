/**
 * One line of a working: words first, the rule and the figures put into it beside them. The tool
 * crib shows these lines and so does a question after the response: they come from one place.
 */
export type Step = {
	words: string;
	/** The rule in letters, such as `F = T / (K · d)`. */
	rule?: string;
	/** The same with the figures put in, such as `50 / (0.18 · 0.010)`. */
	formula?: string;
	value?: number;
	unit?: string;
	/** Places that `value` is printed with; as it stands where left out. */
	decimals?: number;
};
