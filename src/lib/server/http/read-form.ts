/** Never sent back into a page after an error, and never kept with a request key. */
const secret = /password|^current$|token|secret/i;

/**
 * A form as plain data: `rows[0].level` becomes nested, a name that ends in `[]` is a list
 * always, another that comes twice a list too. A file (a roster as CSV) is taken as its text;
 * what is larger goes through upload routes.
 */
export async function readForm(
	form: FormData
): Promise<{ values: Record<string, unknown>; requestKey?: string }> {
	const values: Record<string, unknown> = {};
	let requestKey: string | undefined;
	for (const [name, value] of form.entries()) {
		if (typeof value !== 'string' && value.size === 0) continue; // a file field left empty
		const text = typeof value === 'string' ? value : await value.text();
		if (name === 'requestKey') requestKey = text;
		else place(values, pathOf(name), text, name.endsWith('[]'));
	}
	return { values, requestKey };
}

/** What the page may show again after an error. */
export function withoutSecrets(values: Record<string, unknown>): Record<string, unknown> {
	return Object.fromEntries(Object.entries(values).filter(([name]) => !secret.test(name)));
}

export function holdsSecret(values: Record<string, unknown>): boolean {
	return Object.keys(values).some((name) => secret.test(name));
}

function pathOf(name: string): string[] {
	const parts = name.split(/[.[\]]+/).filter((part) => part !== '');
	if (parts.length > 6 || parts.some((part) => /^(__proto__|constructor|prototype)$/.test(part)))
		return ['form'];
	return parts;
}

function place(
	target: Record<string, unknown>,
	[head = 'form', ...rest]: string[],
	value: string,
	isList: boolean
): void {
	const held = target[head];
	if (rest.length > 0) {
		const inner = held ?? (/^\d{1,3}$/.test(rest[0] ?? '') ? [] : {});
		target[head] = inner;
		if (typeof inner === 'object' && inner !== null)
			place(inner as Record<string, unknown>, rest, value, isList);
	} else if (Array.isArray(held)) held.push(value);
	else if (held === undefined) target[head] = isList ? [value] : value;
	else target[head] = [held, value];
}
