import { CredentialsSignin } from '@auth/core/errors';
import { Problem } from '$lib/domain/problem';

/** A sign-in that was refused for a reason in words; Auth.js carries it through. */
export class Refused extends CredentialsSignin {
	constructor(readonly problem: Problem) {
		super();
		this.code = problem.code;
	}
}

/** Auth.js wraps what its callbacks throw, several times over; ours is looked for inside. */
export function problemIn(error: unknown, depth = 0): Problem | undefined {
	if (error instanceof Problem) return error;
	if (error instanceof Refused) return error.problem;
	if (!(error instanceof Error) || depth > 5) return undefined;
	const cause = error.cause as { err?: unknown } | undefined;
	return problemIn(cause?.err ?? cause, depth + 1);
}
