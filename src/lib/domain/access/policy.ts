import { membershipIn, type Actor, type Role } from '../actor';
import type { Action, Subject } from './subjects';

/** Who may ask at all: a role in the subject's school, or one of the kinds of asker. */
export type Asker = Role | 'anyone' | 'signed-in' | 'system' | `script:${string}`;
type Me = { personId: string; accountId: string };

export type Rule<A extends Action> = {
	who: readonly Asker[];
	/** What must hold besides the role, for a person asking in the named roles. */
	only?: { words: string; roles: readonly Role[]; when: (subject: Subject<A>, me: Me) => boolean };
};

const own = {
	words: 'a student only their own',
	roles: ['student'] as const,
	when: (subject: { ownerId: string }, me: Me) => subject.ownerId === me.personId
};
const notOwn = {
	words: 'never their own work',
	roles: ['instructor'] as const,
	when: (subject: { ownerId: string }, me: Me) => subject.ownerId !== me.personId
};
const notMarked = {
	words: 'nobody who marked the work, or did it',
	roles: ['verifier'] as const,
	when: (subject: { ownerId: string; markerIds: readonly string[] }, me: Me) =>
		subject.ownerId !== me.personId && !subject.markerIds.includes(me.personId)
};
const anyone = { who: ['anyone'] } as const;
const system = { who: ['system'] } as const;
const staff = ['instructor', 'verifier', 'admin'] as const;

/** The one table of who may do what. DEVELOPERS.md prints it and a test holds the two together. */
export const policy: { readonly [A in Action]: Rule<A> } = {
	'site:read': anyone,
	'session:ask': anyone,
	'session:open': system,
	'account:own': { who: ['signed-in'] },
	'password:reset': anyone,
	'school:found': anyone,
	'school:read': { who: ['student', ...staff] },

	'prospectus:read': anyone,
	'data-sheet:read-public': anyone,
	'certificate:check': anyone,
	'certificate:read-own': { who: ['student', 'verifier', 'admin'], only: own },
	'certificate:withdraw': { who: ['verifier'], only: notMarked },

	'bench:read': { who: ['student'], only: own },
	'lesson:read': { who: ['student', ...staff] },
	'film:watch': { who: ['student'], only: own },
	'lesson:finish': { who: ['student'], only: own },

	'sitting:open': { who: ['student'], only: own },
	'sitting:respond': { who: ['student'], only: own },
	'sitting:read': { who: ['student'], only: own },
	'sitting:review': { who: ['instructor', 'verifier'] },

	'submission:open': { who: ['student'], only: own },
	'submission:work': { who: ['student'], only: own },
	'submission:read': { who: ['student', 'instructor', 'verifier'], only: own },
	'photograph:add': { who: ['student'], only: own },
	'photograph:see': { who: ['student', 'instructor', 'verifier'], only: own },
	'original:see': { who: ['verifier'] },

	'marking:list': { who: ['instructor'] },
	'marking:take': { who: ['instructor'], only: notOwn },
	'mark:sign': {
		who: ['instructor'],
		only: {
			words: 'never their own work, and only while it is with them',
			roles: ['instructor'],
			when: (subject, me) =>
				subject.ownerId !== me.personId && subject.leaseHolderId === me.personId
		}
	},

	'progress:read': { who: ['instructor', 'verifier', 'admin', 'script:progress'] },
	'bench-hours:enter': { who: ['instructor'], only: notOwn },
	'register:read': { who: ['instructor', 'admin'] },
	'publication:read': { who: staff },
	'data-sheet:edit': { who: ['instructor'] },
	'data-sheet:publish': { who: ['instructor'] },

	'award:list': { who: ['verifier'] },
	'award:decide': { who: ['verifier'], only: notMarked },

	'cohort:read': { who: ['instructor', 'admin', 'script:cohorts'] },
	'cohort:create': { who: ['admin'] },
	'roster:plan': { who: ['admin', 'script:roster'] },
	'roster:apply': { who: ['admin', 'script:roster'] },
	'invitation:send': { who: ['admin'] },
	'place:buy': { who: ['admin'] },
	'place:record': { who: ['admin'] },
	'invitation:read': anyone,
	'invitation:accept': anyone,

	'people:read': { who: ['admin'] },
	'people:edit': { who: ['admin'] },
	'course:take': { who: ['admin', 'system'] },
	'mail:read': { who: ['admin'] },
	'ledger:read': { who: ['verifier', 'admin'] },
	'api-token:manage': { who: ['admin'] },
	'role:accept': anyone,

	'system:run': system
};

/**
 * May this actor do this to this subject? A person with several roles may if any one of them
 * does. Nothing that is not in the table is allowed.
 */
export function may<A extends Action>(actor: Actor, action: A, subject: Subject<A>): boolean {
	const rule: Rule<A> = policy[action];
	const schoolId = 'schoolId' in subject ? (subject as { schoolId: string }).schoolId : undefined;
	if (rule.who.includes('anyone')) return true;
	if (actor.kind === 'system') return rule.who.includes('system');
	if (actor.kind === 'script')
		return (
			actor.schoolId === schoolId &&
			actor.scopes.some((scope) => rule.who.includes(`script:${scope}`))
		);
	if (actor.kind !== 'account') return false;
	if (rule.who.includes('signed-in'))
		return !('accountId' in subject) || subject.accountId === actor.accountId;
	const membership = schoolId === undefined ? undefined : membershipIn(actor, schoolId);
	if (!membership) return false;
	const me = { personId: membership.personId, accountId: actor.accountId };
	return membership.roles.some((role) => {
		if (!rule.who.includes(role)) return false;
		return rule.only?.roles.includes(role) ? rule.only.when(subject, me) : true;
	});
}

/** The cheap question before anything is loaded: could this actor ever do this here? */
export function mightEver(actor: Actor, action: Action, schoolId: string | undefined): boolean {
	const { who } = policy[action];
	if (who.includes('anyone')) return true;
	if (actor.kind === 'system') return who.includes('system');
	if (actor.kind === 'script')
		return actor.schoolId === schoolId && actor.scopes.some((one) => who.includes(`script:${one}`));
	if (actor.kind !== 'account') return false;
	if (who.includes('signed-in')) return true;
	const roles = schoolId === undefined ? [] : (membershipIn(actor, schoolId)?.roles ?? []);
	return roles.some((role) => who.includes(role));
}
