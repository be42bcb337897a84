/**
 * Groups of files that import each other in a circle (Tarjan's strongly connected components of
 * more than one file, or a file that imports itself).
 */
export function circles(graph: ReadonlyMap<string, readonly string[]>): string[][] {
	const index = new Map<string, number>();
	const low = new Map<string, number>();
	const stack: string[] = [];
	const found: string[][] = [];

	function visit(node: string): number {
		const own = index.size;
		index.set(node, own);
		low.set(node, own);
		stack.push(node);
		for (const next of graph.get(node) ?? []) {
			if (!index.has(next)) lower(node, visit(next));
			else if (stack.includes(next)) lower(node, index.get(next) ?? own);
		}
		if (low.get(node) === own) {
			const group = stack.splice(stack.indexOf(node));
			if (group.length > 1 || graph.get(node)?.includes(node)) found.push(group.sort());
		}
		return low.get(node) ?? own;
	}
	const lower = (node: string, to: number) => low.set(node, Math.min(low.get(node) ?? to, to));

	for (const node of graph.keys()) if (!index.has(node)) visit(node);
	return found;
}
