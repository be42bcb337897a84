/** What is known of the tries so far, for one account, one device or one address. */
export type Tries = { failures: number; lastAt: string; waitUntil: string | null };

export type WaitRule = {
	/** Tries before the first wait. */
	free: number;
	firstWaitMs: number;
	longestWaitMs: number;
	/** Without a try for so long, the count begins anew. */
	forgottenAfterMs: number;
};

const second = 1000;
const minute = 60 * second;
const hour = 60 * minute;

export const waitRules = {
	account: {
		free: 5,
		firstWaitMs: 30 * second,
		longestWaitMs: hour,
		forgottenAfterMs: 24 * hour
	},
	/** A device that the account was used on before: not held up by what strangers try. */
	device: { free: 5, firstWaitMs: 30 * second, longestWaitMs: hour, forgottenAfterMs: 24 * hour },
	/** A whole class may sit behind one address. */
	address: {
		free: 60,
		firstWaitMs: 10 * second,
		longestWaitMs: 15 * minute,
		forgottenAfterMs: hour
	},
	/** Letters to one mailbox. */
	letter: { free: 3, firstWaitMs: minute, longestWaitMs: hour, forgottenAfterMs: 24 * hour }
} as const satisfies Record<string, WaitRule>;

export type Turn = { kind: 'wait'; until: Date } | { kind: 'go'; tries: Tries };

/**
 * Asks for a try and counts it before it is made, so that a hundred tries sent at once are
 * counted like a hundred sent in turn. A try during a wait neither counts nor lengthens it.
 */
export function askForTurn(held: Tries | undefined, rule: WaitRule, at: Date): Turn {
	const now = at.getTime();
	if (held?.waitUntil && Date.parse(held.waitUntil) > now)
		return { kind: 'wait', until: new Date(held.waitUntil) };
	const forgotten = !held || now - Date.parse(held.lastAt) > rule.forgottenAfterMs;
	const failures = (forgotten ? 0 : held.failures) + 1;
	const waitMs = waitAfterMs(failures, rule);
	return {
		kind: 'go',
		tries: {
			failures,
			lastAt: at.toISOString(),
			waitUntil: waitMs === 0 ? null : new Date(now + waitMs).toISOString()
		}
	};
}

/** Nothing for the free tries, then twice as long each time. */
export function waitAfterMs(failures: number, rule: WaitRule): number {
	if (failures < rule.free) return 0;
	return Math.min(rule.longestWaitMs, rule.firstWaitMs * 2 ** (failures - rule.free));
}

/** Takes one try back that turned out to be right. */
export function tryGivenBack(held: Tries, rule: WaitRule): Tries {
	const failures = Math.max(0, held.failures - 1);
	return { ...held, failures, waitUntil: failures < rule.free ? null : held.waitUntil };
}

/** "40 seconds", "1 minute", "2 minutes": rounded up, so that waiting so long is enough. */
export function waitWords(ms: number): string {
	const seconds = Math.max(1, Math.ceil(ms / second));
	if (seconds < 90) return seconds === 1 ? '1 second' : `${seconds} seconds`;
	const minutes = Math.ceil(seconds / 60);
	return `${minutes} minutes`;
}
