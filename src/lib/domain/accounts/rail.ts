import type { Role } from '../actor';

export type RailLink = { path: string; words: string };

/** What each role goes to, in the order of its day. The first is where signing in leads. */
const byRole: Record<Role, readonly RailLink[]> = {
	student: [
		{ path: 'bench', words: 'Bench' },
		{ path: 'certificates', words: 'Certificates' },
		{ path: 'data-sheets', words: 'Data sheets' }
	],
	instructor: [
		{ path: 'marking', words: 'Marking' },
		{ path: 'progress', words: 'Progress chart' },
		{ path: 'data-sheets', words: 'Data sheets' }
	],
	verifier: [
		{ path: 'awards', words: 'Awards' },
		{ path: 'ledger', words: 'Ledger' }
	],
	admin: [
		{ path: 'cohorts', words: 'Cohorts' },
		{ path: 'people', words: 'People' },
		{ path: 'mail', words: 'Mail' },
		{ path: 'ledger', words: 'Ledger' }
	]
};
const order: readonly Role[] = ['student', 'instructor', 'verifier', 'admin'];

/** The rail of somebody in a school: what their roles lead to, each once. */
export function railOf(held: readonly Role[]): RailLink[] {
	const links = order.filter((role) => held.includes(role)).flatMap((role) => byRole[role]);
	return links.filter((link, i) => links.findIndex((one) => one.path === link.path) === i);
}

/** Where somebody's day in a school begins. Work that waits for them comes before their own learning. */
export function firstPage(held: readonly Role[]): string | undefined {
	const role = (['admin', 'instructor', 'verifier', 'student'] as const).find((one) =>
		held.includes(one)
	);
	return role && byRole[role][0]?.path;
}
