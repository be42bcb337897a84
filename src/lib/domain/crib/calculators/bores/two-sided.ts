import type { Outcome } from '$lib/kernel/outcome';
import type { RuledReading } from '../../worked';
import { limitsOf, ruledBetween } from './ruled-between';

export type LimitValues = {
	buildLeast: number | undefined;
	buildMost: number | undefined;
	runMost: number | undefined;
};

/** A least and a most clearance: both are held to build, the most to run again. One, where they are one. */
export function ruledBothEnds(
	of: string,
	{ leastMm, mostMm }: { leastMm: number; mostMm: number },
	expandedMm: number | undefined,
	{ buildLeast, buildMost, runMost }: LimitValues
): Outcome<RuledReading[]> {
	const build = limitsOf(buildLeast, buildMost);
	const runAgain = limitsOf(undefined, runMost);
	const noun = of.toLowerCase();
	return ruledBetween(
		leastMm === mostMm
			? [{ of, valueMm: mostMm, expandedMm, build, 'run-again': runAgain }]
			: [
					{ of: `Least ${noun}`, valueMm: leastMm, expandedMm, build },
					{ of: `Most ${noun}`, valueMm: mostMm, expandedMm, build, 'run-again': runAgain }
				]
	);
}
