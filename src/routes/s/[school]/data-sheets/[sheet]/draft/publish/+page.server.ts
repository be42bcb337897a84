import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { publishSheet, reviewSheetDraft } from '$lib/server/services/courses/publish-sheet';
import type { RequestEvent } from './$types';

export const load = pageLoad(reviewSheetDraft, ({ params }: RequestEvent) => ({
	key: params.sheet
}));

export const actions = {
	default: formAction(publishSheet, {
		extra: ({ params, locals }) => ({ key: params.sheet, schoolId: locals.school?.id }),
		done: (_, { params }) => `/s/${params.school}/data-sheets/${params.sheet}`
	})
};
