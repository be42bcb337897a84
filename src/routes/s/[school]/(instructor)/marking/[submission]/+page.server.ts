import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { signMark } from '$lib/server/services/marking/sign-mark';
import {
	putBack,
	readForMarking,
	takeForMarking
} from '$lib/server/services/marking/take-for-marking';
import type { RequestEvent } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({
	submissionId: params.submission
});

export const load = pageLoad(readForMarking, (event: RequestEvent) => at(event));

export const actions = {
	take: formAction(takeForMarking, { extra: at }),
	'put-back': formAction(putBack, {
		extra: at,
		done: (_, { params }) => `/s/${params.school}/marking`
	}),
	sign: formAction(signMark, { extra: at })
};
