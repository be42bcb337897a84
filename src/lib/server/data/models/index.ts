import type { Table } from '../table';
import * as accounts from './accounts';
import * as certificates from './certificates';
import * as cohorts from './cohorts';
import * as drafts from './drafts';
import * as jobSheets from './job-sheets';
import * as progress from './progress';
import * as publications from './publications';
import * as quizzes from './quizzes';
import * as records from './records';

/** Every table. The structure test holds this list against the migrated file. */
export const tables: Table[] = [
	accounts,
	publications,
	cohorts,
	progress,
	quizzes,
	jobSheets,
	certificates,
	drafts,
	records
].flatMap((module) => Object.values(module) as Table[]);

export * from './accounts';
export * from './certificates';
export * from './cohorts';
export * from './drafts';
export * from './job-sheets';
export * from './progress';
export * from './publications';
export * from './quizzes';
export * from './records';
