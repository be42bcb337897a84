import Stripe from 'stripe';
import { Problem } from '$lib/domain/problem';

/** The till's own words may name keys and requests: they go to the log as the cause, not to a page. */
export function problemOf(error: unknown): never {
	if (!(error instanceof Stripe.errors.StripeError)) throw error;
	const problem = worded(error);
	problem.cause = error;
	throw problem;
}

function worded(error: InstanceType<typeof Stripe.errors.StripeError>): Problem {
	const { errors } = Stripe;
	if (error instanceof errors.StripeConnectionError || (error.statusCode ?? 0) >= 500)
		return new Problem('unavailable', 'The till did not answer. Nothing was charged. Try again.');
	if (error instanceof errors.StripeRateLimitError)
		return new Problem('unavailable', 'The till is busy. Nothing was charged. Try again.');
	if (error instanceof errors.StripeIdempotencyError)
		return new Problem('conflict', 'This order was sent to the till before with other figures.');
	if (error.code === 'resource_missing')
		return new Problem('absent', 'The till does not know this payment.');
	if (error instanceof errors.StripeAuthenticationError)
		return new Problem(
			'refused',
			'The till does not know this server’s key. Tell whoever runs it.'
		);
	return new Problem('refused', 'The till refused this. Nothing was charged.');
}
