import { jsonWrite } from '$lib/server/http/json';
import { openOnDevice } from '$lib/server/services/quizzes/open-on-device';
import type { RequestEvent } from './$types';

export const POST = jsonWrite(openOnDevice, ({ params }: RequestEvent) => ({
	sittingId: params.sitting
}));
