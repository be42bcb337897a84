import {
	askForTurn,
	tryGivenBack,
	type Turn,
	type WaitRule
} from '$lib/domain/accounts/sign-in-waits';
import { signInAttempts } from '../models';
import { find, insert, remove, update } from '../rows';
import { acrossSchools, type Scope } from '../scope';

/** Counts a try in a bucket, or says until when to wait. Inside a transaction. */
export async function takeTurn(
	scope: Scope,
	bucket: string,
	rule: WaitRule,
	at: Date
): Promise<Turn> {
	const common = acrossSchools(scope);
	const held = await find(common, signInAttempts, { bucket });
	const turn = askForTurn(held, rule, at);
	if (turn.kind === 'wait') return turn;
	if (held) await update(common, signInAttempts, { bucket }, turn.tries);
	else await insert(common, signInAttempts, { bucket, ...turn.tries });
	return turn;
}

/** One try was right: it does not count against its address. */
export async function giveTurnBack(scope: Scope, bucket: string, rule: WaitRule) {
	const common = acrossSchools(scope);
	const held = await find(common, signInAttempts, { bucket });
	if (held) await update(common, signInAttempts, { bucket }, tryGivenBack(held, rule));
}

export function forgetTries(scope: Scope, bucket: string) {
	return remove(acrossSchools(scope), signInAttempts, { bucket });
}

export function forgetOldTries(scope: Scope, before: Date) {
	return remove(acrossSchools(scope), signInAttempts, { lastAt: { below: before.toISOString() } });
}
