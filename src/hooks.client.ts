import type { HandleClientError } from '@sveltejs/kit';

/** Said on the page; the console keeps what happened, for whoever is asked to look. */
export const handleError: HandleClientError = ({ error, status }) => {
	if (status !== 404) console.error(error);
	return {
		message:
			status === 404
				? 'There is no page at this address.'
				: 'Something went wrong in this page. Load it again; what was saved is kept.'
	};
};
