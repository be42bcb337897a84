import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { handInSitting } from '$lib/server/services/quizzes/end-sitting';
import { readOpenSitting } from '$lib/server/services/quizzes/read-quiz';
import type { RequestEvent } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({
	sittingId: params.sitting
});

export const load = pageLoad(readOpenSitting, (event: RequestEvent) => at(event));

export const actions = {
	'hand-in': formAction(handInSitting, {
		extra: at,
		done: (_, { params }) => `/s/${params.school}/sittings/${params.sitting}/result`
	})
};
