import { cannot, computed, type Outcome } from '../outcome';

export type Pass = {
	/** Which stage of the plan, counted from 1; none where the bolts are slackened again. */
	stage?: number;
	/** In the order in which the hand takes them. */
	bolts: string[];
};

/**
 * A plan as rounds of the whole pattern: every bolt through one stage before any begins the next;
 * where a plan settles its gasket, all bolts are slackened between, last tightened first.
 *
 * @param order bolt ids as they are tightened @param stages how many stages, one to twelve
 * @param slackenAfter the stage after which all are slackened to nothing; none where left out
 * @returns one round a stage, and the slackening between; "cannot" where it would come last
 * Source: US Army TM 10-3930-669-20, para E-4 (references OR01 and OR02); settling cycles as OR32,
 *   OR33 and OR35 print them.
 * @example stagePasses(['a', 'b'], 2, 1) // a b at stage 1, b a slackened, a b at stage 2
 */
export function stagePasses(
	order: readonly string[],
	stages: number,
	slackenAfter?: number
): Outcome<Pass[]> {
	if (order.length === 0) return cannot('there is no bolt to tighten');
	if (!Number.isInteger(stages) || stages < 1 || stages > 12)
		return cannot('a plan has one to twelve stages');
	if (slackenAfter !== undefined) {
		if (!Number.isInteger(slackenAfter) || slackenAfter < 1)
			return cannot('say by its number after which stage the bolts are slackened');
		if (slackenAfter >= stages)
			return cannot('a plan that slackens goes on to tighten: a later stage is missing');
	}
	const passes: Pass[] = [];
	for (let stage = 1; stage <= stages; stage++) {
		passes.push({ stage, bolts: [...order] });
		if (stage === slackenAfter) passes.push({ bolts: [...order].reverse() });
	}
	return computed(passes);
}
