/** What a form's action sends back when something needs another look. */
export type FormFault = {
	values: Record<string, unknown>;
	fields: Record<string, string[]>;
	words: string;
};

/** The value to show again after an error. */
export function kept(fault: Partial<FormFault> | null | undefined, name: string): string {
	const value = fault?.values?.[name];
	return typeof value === 'string' ? value : '';
}

export function problemsOf(fault: Partial<FormFault> | null | undefined, name: string): string[] {
	return fault?.fields?.[name] ?? [];
}
