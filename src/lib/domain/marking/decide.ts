import type { MarkRow } from './mark';
import type { Criterion, MarkingScheme } from './schema';

export type Decision = {
	decision: 'competent' | 'not-yet';
	/** Why, as the page prints it. */
	because: string[];
	/** What to do again, row by row. */
	redo: string[];
};

/** What keeps a mark from being signed: rows without a level, or a witness who is not named. */
export function markFaults(scheme: MarkingScheme, rows: readonly MarkRow[]): string[] {
	return scheme.criteria.flatMap((criterion) => {
		const row = rows.find((one) => one.criterion === criterion.key);
		if (!row || row.level >= criterion.levels.length)
			return [`${criterion.title}: choose a level.`];
		if (criterion.needsWitness && !row.witnessId && row.level >= criterion.leastLevel)
			return [`${criterion.title}: say who saw it at the bench.`];
		if (row.level < criterion.leastLevel && row.words === '')
			return [`${criterion.title}: say in words what was missing.`];
		return [];
	});
}

/**
 * The rule, in words: competent when every must-pass row reaches its least level, no row lies
 * more than one level below its own, and no more rows fall short than the scheme allows. The
 * marker gives levels; the rule decides.
 */
export function decide(scheme: MarkingScheme, rows: readonly MarkRow[]): Decision {
	const levelOf = (criterion: Criterion) =>
		rows.find((one) => one.criterion === criterion.key)?.level ?? 0;
	const short = scheme.criteria.filter((one) => levelOf(one) < one.leastLevel);
	const stops = short.filter((one) => one.mustPass);
	const far = short.filter((one) => !one.mustPass && levelOf(one) < one.leastLevel - 1);
	const near = short.length - stops.length - far.length;
	const because = [
		...stops.map((one) => `${one.title} must pass and does not.`),
		...far.map((one) => `${one.title} lies more than one level below its least.`)
	];
	if (near > scheme.mayFallShort)
		because.push(
			scheme.mayFallShort === 0
				? `Every row must reach its least level; ${names(short)} ${short.length === 1 ? 'does' : 'do'} not.`
				: `${near} rows fall one level short; the scheme allows ${scheme.mayFallShort}.`
		);
	if (because.length > 0)
		return { decision: 'not-yet', because, redo: short.map((one) => `${one.title}: ${one.redo}`) };
	const all = 'Every row reaches its least level.';
	const some = `${names(short)} ${short.length === 1 ? 'falls' : 'fall'} one level short, which the scheme allows; all else stands.`;
	return { decision: 'competent', because: [short.length === 0 ? all : some], redo: [] };
}

function names(criteria: readonly Criterion[]): string {
	return criteria.map((one) => one.title).join(', ');
}
