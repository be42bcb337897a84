/** One question of a sitting after scoring; a question without a response has no points. */
export type ScoredItem = {
	key: string;
	outcome: string;
	points: number;
	right: boolean;
	omitted: boolean;
};

export type OutcomeShare = { outcome: string; points: number; of: number };
export type SittingScore = {
	points: number;
	of: number;
	share: number;
	right: number;
	omitted: number;
	byOutcome: OutcomeShare[];
};

/** Every question weighs one point. Sums are rounded to a millionth, so that thirds add up. */
export function scoreSitting(items: readonly ScoredItem[]): SittingScore {
	if (items.length === 0) throw new RangeError('a sitting has at least one question');
	const outcomes = [...new Set(items.map((one) => one.outcome))];
	const points = sum(items);
	return {
		points,
		of: items.length,
		share: tidy(points / items.length),
		right: items.filter((one) => one.right).length,
		omitted: items.filter((one) => one.omitted).length,
		byOutcome: outcomes.map((outcome) => {
			const of = items.filter((one) => one.outcome === outcome);
			return { outcome, points: sum(of), of: of.length };
		})
	};
}

function sum(items: readonly ScoredItem[]): number {
	return tidy(items.reduce((total, one) => total + (one.omitted ? 0 : one.points), 0));
}

function tidy(value: number): number {
	return Math.round(value * 1e6) / 1e6;
}
