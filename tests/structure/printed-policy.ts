import { policy, type Rule } from '$lib/domain/access/policy';
import type { Action } from '$lib/domain/access/subjects';

/**
 * The policy as DEVELOPERS.md prints it: one row an action, who may ask, what must hold besides.
 * When the test that compares them fails, its output holds the rows to print.
 */
export function policyRows(): string[][] {
	return Object.entries(policy).map(([action, rule]) => {
		const { who, only } = rule as Rule<Action>;
		return [action, who.join(', '), only?.words ?? ''];
	});
}
