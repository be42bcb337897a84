import { evidenceComplete } from './evidence-complete';
import type { AwardRule } from './rule';

/** Old versions stay: what was awarded under them must be explainable as long as it is checked. */
export const awardRules: readonly AwardRule[] = [evidenceComplete];

/** As a course and an award name it: `evidence-complete@1`. */
export function ruleName(rule: Pick<AwardRule, 'key' | 'version'>): string {
	return `${rule.key}@${rule.version}`;
}

/** @throws Error for a name that no version has: a course with one is not published. */
export function awardRule(name: string): AwardRule {
	const found = awardRules.find((rule) => ruleName(rule) === name);
	if (!found) throw new Error(`There is no award rule ${name}.`);
	return found;
}

export const awardRuleNames: readonly string[] = awardRules.map(ruleName);
