/**
 * The facts that each right is decided on, loaded by the use case before it asks. A key here
 * without a line in policy.ts does not compile, and the other way round.
 */
type School = { schoolId: string };
/** Something of one student's: their own, or looked at by those who teach them. */
type Owned = School & { ownerId: string };
type Marked = Owned & { markerIds: readonly string[] };

export type Subjects = {
	'site:read': object;
	'session:ask': object;
	'session:open': object;
	'account:own': { accountId: string };
	'password:reset': object;
	'school:found': object;
	'school:read': School;

	'prospectus:read': object;
	'data-sheet:read-public': object;
	'certificate:check': object;
	'certificate:read-own': Owned;
	'certificate:withdraw': Marked;

	'bench:read': Owned;
	'lesson:read': School;
	'film:watch': Owned;
	'lesson:finish': Owned;

	'sitting:open': Owned;
	'sitting:respond': Owned;
	'sitting:read': Owned;
	'sitting:review': School;

	'submission:open': Owned;
	'submission:work': Owned;
	'submission:read': Owned;
	'photograph:add': Owned;
	'photograph:see': Owned;
	'original:see': School;

	'marking:list': School;
	'marking:take': Owned;
	'mark:sign': Owned & { leaseHolderId: string | null };

	'progress:read': School;
	'bench-hours:enter': Owned;
	'register:read': School;
	'publication:read': School;
	'data-sheet:edit': School;
	'data-sheet:publish': School;

	'award:list': School;
	'award:decide': Marked;

	'cohort:read': School;
	'cohort:create': School;
	'roster:plan': School;
	'roster:apply': School;
	'invitation:send': School;
	'place:buy': School;
	'place:record': School;
	'invitation:read': object;
	'invitation:accept': object;

	'people:read': School;
	'people:edit': School;
	'course:take': School;
	'mail:read': School;
	'ledger:read': School;
	'api-token:manage': School;
	'role:accept': object;

	'system:run': object;
};

export type Action = keyof Subjects;
export type Subject<A extends Action> = Subjects[A];
