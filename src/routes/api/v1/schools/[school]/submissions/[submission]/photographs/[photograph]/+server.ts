import { jsonWrite } from '$lib/server/http/json';
import { removePhotograph } from '$lib/server/services/submissions/add-photograph';
import type { RequestEvent } from './$types';

export const DELETE = jsonWrite(removePhotograph, ({ params }: RequestEvent) => ({
	submissionId: params.submission,
	photographId: params.photograph
}));
