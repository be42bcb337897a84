import { error } from '@sveltejs/kit';
import { calculatorNamed } from '$lib/domain/crib/registry';
import type { PageLoad } from './$types';

export const load: PageLoad = ({ params }) => {
	const found = calculatorNamed(params.calculator);
	if (!found) error(404, { message: 'The crib has no such calculator. Its index lists them all.' });
	return { key: found.key };
};
