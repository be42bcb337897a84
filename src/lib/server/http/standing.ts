import { Problem } from '$lib/domain/problem';

/**
 * What a link leads to, or null where it does not stand any more: used up, withdrawn, too old
 * and invented look the same, and the page says in words what to do.
 */
export async function standing<Out>(asked: Promise<Out>): Promise<Out | null> {
	try {
		return await asked;
	} catch (problem) {
		if (problem instanceof Problem) return null;
		throw problem;
	}
}
