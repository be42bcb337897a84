import { policy } from './policy';

/** What a token can be allowed, each with a line of its own in the policy. */
export const scriptScopes = ['progress', 'cohorts', 'roster'] as const;
export type ScriptScope = (typeof scriptScopes)[number];

export const scopeWords: Record<ScriptScope, string> = {
	progress: 'Read the progress chart',
	cohorts: 'Read cohorts and their rosters',
	roster: 'Plan and change rosters'
};

/** Every scope that the policy knows, for the test that holds the two together. */
export function scopesInPolicy(): string[] {
	const asked = Object.values(policy).flatMap((rule) => rule.who);
	const scopes = asked.flatMap((one) => (one.startsWith('script:') ? [one.slice(7)] : []));
	return [...new Set(scopes)].sort();
}
