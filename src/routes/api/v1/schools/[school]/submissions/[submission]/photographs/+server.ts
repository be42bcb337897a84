import { json } from '@sveltejs/kit';
import { isUlid } from '$lib/domain/ids';
import { inputProblem } from '$lib/domain/problem';
import { answered, demandOrigin } from '$lib/server/http/json';
import { addPhotograph } from '$lib/server/services/submissions/add-photograph';
import type { RequestHandler } from './$types';

/** The body is the photograph itself: it streams to the disk, and its content says what it is. */
export const POST: RequestHandler = (event) =>
	answered(event, async () => {
		await demandOrigin(event);
		const { searchParams } = event.url;
		const requestKey = searchParams.get('requestKey') ?? '';
		if (!isUlid(requestKey))
			throw inputProblem({ requestKey: ['Send a ULID of your own with each write.'] });
		const answer = await addPhotograph(await event.locals.caller(requestKey), {
			submissionId: event.params.submission,
			shotKey: searchParams.get('shot') ?? '',
			file: event.request.body
		});
		return json(answer, { status: 201 });
	});
