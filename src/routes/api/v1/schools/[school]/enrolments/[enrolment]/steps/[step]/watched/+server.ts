import { jsonWrite } from '$lib/server/http/json';
import { watchFilm } from '$lib/server/services/learning/watch-film';
import type { RequestEvent } from './$types';

export const POST = jsonWrite(watchFilm, ({ params }: RequestEvent) => ({
	enrolmentId: params.enrolment,
	stepKey: params.step
}));
