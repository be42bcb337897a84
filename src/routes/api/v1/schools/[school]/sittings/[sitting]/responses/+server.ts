import { jsonWrite } from '$lib/server/http/json';
import { saveResponse } from '$lib/server/services/quizzes/save-response';
import type { RequestEvent } from './$types';

export const POST = jsonWrite(saveResponse, ({ params }: RequestEvent) => ({
	sittingId: params.sitting
}));
