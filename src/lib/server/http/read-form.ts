/** Never sent back into a page after an error. */
const secret = /password|token|secret|card/i;

/**
 * A form as plain data: `rows[0].level` becomes nested, a name that comes twice a list. Files are
 * left out: they go through upload routes.
 */
export function readForm(form: FormData): { values: Record<string, unknown>; requestKey?: string } {
	const values: Record<string, unknown> = Object.create(null) as Record<string, unknown>;
	let requestKey: string | undefined;
	for (const [name, value] of form.entries()) {
		if (typeof value !== 'string') continue;
		if (name === 'requestKey') requestKey = value;
		else place(values, pathOf(name), value);
	}
	return { values: JSON.parse(JSON.stringify(values)) as Record<string, unknown>, requestKey };
}

/** What the page may show again after an error: no secrets. */
export function withoutSecrets(values: Record<string, unknown>): Record<string, unknown> {
	return Object.fromEntries(Object.entries(values).filter(([name]) => !secret.test(name)));
}

function pathOf(name: string): string[] {
	const parts = name.split(/[.[\]]+/).filter((part) => part !== '');
	if (parts.length > 6 || parts.some((part) => /^(__proto__|constructor|prototype)$/.test(part)))
		return ['form'];
	return parts;
}

function place(target: Record<string, unknown>, path: string[], value: string): void {
	const [head = 'form', ...rest] = path;
	if (rest.length === 0) {
		const held = target[head];
		target[head] =
			held === undefined
				? value
				: Array.isArray(held)
					? [...(held as unknown[]), value]
					: [held, value];
		return;
	}
	const next = rest[0] ?? '';
	const index = /^\d{1,3}$/.test(next);
	target[head] ??= index ? [] : {};
	const inner = target[head];
	if (inner && typeof inner === 'object') place(inner as Record<string, unknown>, rest, value);
}
