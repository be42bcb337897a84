import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { beginSheetDraft } from '$lib/server/services/courses/begin-sheet-draft';
import { readSheetDraft } from '$lib/server/services/courses/read-sheet-draft';
import {
	discardSheetDraft,
	readFileIntoDraft
} from '$lib/server/services/courses/work-on-sheet-draft';
import type { RequestEvent } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({ key: params.sheet });

export const load = pageLoad(readSheetDraft, (event: RequestEvent) => at(event));

export const actions = {
	begin: formAction(beginSheetDraft, { extra: at }),
	'read-file': formAction(readFileIntoDraft, {
		extra: at,
		done: ({ version, leftOut }) => ({ readVersion: version, leftOut })
	}),
	discard: formAction(discardSheetDraft, {
		extra: at,
		done: ({ isPublished }, { params }) =>
			`/s/${params.school}/data-sheets${isPublished ? `/${params.sheet}` : ''}`
	})
};
