import type { Transaction } from 'sequelize';
import type { Database } from './database';

/**
 * What a query may see: one school's rows, inside one transaction or none. Only the use-case
 * wrapper, the worker and the seeds make one (a structure test holds them to it), so that a
 * query cannot be written that forgets the school.
 */
export type SchoolScope = {
	readonly kind: 'school';
	readonly schoolId: string;
	readonly database: Database;
	readonly transaction: Transaction | null;
};

/** For what is common to all schools: accounts, sessions, looking a certificate up, the worker. */
export type CommonScope = {
	readonly kind: 'common';
	readonly database: Database;
	readonly transaction: Transaction | null;
};

export type Scope = SchoolScope | CommonScope;

export function schoolScope(
	database: Database,
	schoolId: string,
	transaction: Transaction | null
): SchoolScope {
	return { kind: 'school', schoolId, database, transaction };
}

export function commonScope(database: Database, transaction: Transaction | null): CommonScope {
	return { kind: 'common', database, transaction };
}

/** Narrows a common scope to one school, once that school is known. */
export function within(scope: Scope, schoolId: string): SchoolScope {
	return schoolScope(scope.database, schoolId, scope.transaction);
}

export function acrossSchools(scope: Scope): CommonScope {
	return commonScope(scope.database, scope.transaction);
}
