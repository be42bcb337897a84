import { json } from '@sveltejs/kit';
import { system } from '$lib/domain/actor';
import { Problem } from '$lib/domain/problem';
import { answered } from '$lib/server/http/json';
import { receivePaymentEvent } from '$lib/server/services/cohorts/settle-payment';
import type { RequestHandler } from './$types';

/** The till's events. The signature over the raw body is what lets them in. */
export const POST: RequestHandler = (event) =>
	answered(event, async () => {
		const { house } = event.locals;
		const rawBody = await event.request.text();
		const signature = event.request.headers.get('stripe-signature') ?? '';
		const caller = { house, actor: system, schoolId: undefined };
		try {
			return json(await receivePaymentEvent(caller, { rawBody, signature }));
		} catch (problem) {
			// The till shows its owner the answer: to it a bad signature is a bad request, not a bill.
			if (!(problem instanceof Problem) || problem.code !== 'refused') throw problem;
			throw new Problem('input', problem.words);
		}
	});
