export const roles = ['student', 'instructor', 'verifier', 'admin'] as const;
export type Role = (typeof roles)[number];

/** What a role is called on a page. */
export const roleWords: Record<Role, string> = {
	student: 'student',
	instructor: 'instructor',
	verifier: 'verifier',
	admin: 'school admin'
};

export type Membership = {
	schoolId: string;
	schoolSlug: string;
	schoolName: string;
	personId: string;
	roles: readonly Role[];
};

/** Who asks. A person is an account; what they may do comes from their memberships, school by school. */
export type Actor =
	| { kind: 'anyone' }
	| {
			kind: 'account';
			accountId: string;
			sessionId: string;
			email: string;
			name: string;
			memberships: readonly Membership[];
	  }
	| { kind: 'script'; tokenId: string; schoolId: string; scopes: readonly string[] }
	| { kind: 'system' };

export const anyone: Actor = { kind: 'anyone' };
export const system: Actor = { kind: 'system' };

export function membershipIn(actor: Actor, schoolId: string): Membership | undefined {
	return actor.kind === 'account'
		? actor.memberships.find((one) => one.schoolId === schoolId)
		: undefined;
}

export function hasRole(actor: Actor, schoolId: string, role: Role): boolean {
	return membershipIn(actor, schoolId)?.roles.includes(role) ?? false;
}
