/**
 * Stripe's requests are forms whose names spell a tree: `line_items[0][quantity]=3`.
 * @typedef {{ [key: string]: FormTree | string }} FormTree
 */

/**
 * @param {string} text a form body, or the query of an address
 * @returns {FormTree}
 */
export function treeOf(text) {
	/** @type {FormTree} */
	const tree = Object.create(null);
	for (const [name, value] of new URLSearchParams(text)) {
		const path = name.split(/[[\]]+/).filter((part) => part !== '');
		// `expand[]=x` has no number of its own.
		if (name.endsWith('[]')) path.push(`${value}`);
		put(tree, path, value);
	}
	return tree;
}

/** @param {FormTree} tree @param {string[]} path @param {string} value */
function put(tree, [key = '', ...rest], value) {
	if (rest.length === 0) {
		tree[key] = value;
		return;
	}
	const below = tree[key];
	/** @type {FormTree} */
	const branch = typeof below === 'object' ? below : Object.create(null);
	tree[key] = branch;
	put(branch, rest, value);
}

/** @param {FormTree | string | undefined} found @returns {FormTree} */
export const branchOf = (found) => (typeof found === 'object' ? found : {});

/** @param {FormTree | string | undefined} found @returns {string | null} */
export const textOf = (found) => (typeof found === 'string' && found !== '' ? found : null);

/** @param {FormTree | string | undefined} found @returns {(FormTree | string)[]} */
export const listOf = (found) => Object.values(branchOf(found));

/** @param {FormTree | string | undefined} found @returns {Record<string, string>} */
export const wordsOf = (found) =>
	Object.fromEntries(
		Object.entries(branchOf(found)).flatMap(([key, value]) =>
			typeof value === 'string' ? [[key, value]] : []
		)
	);
