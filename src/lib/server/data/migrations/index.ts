import { Umzug, type UmzugStorage } from 'umzug';
import { QueryTypes } from 'sequelize';
import type { Database } from '../database';
import { inTransaction } from '../transaction';
import { schoolsAndAccounts } from './001-schools-and-accounts';
import { coursesAndCohorts } from './002-courses-and-cohorts';
import { progressAndQuizzes } from './003-progress-and-quizzes';
import { jobSheetsAndAwards } from './004-job-sheets-and-awards';
import { drafts } from './005-drafts';

/** An explicit list, oldest first. A migration that has landed is never edited. */
export const migrations = [
	schoolsAndAccounts,
	coursesAndCohorts,
	progressAndQuizzes,
	jobSheetsAndAwards,
	drafts
];

/** Brings a file up to the newest version, one transaction a migration. */
export async function migrate(database: Database, upTo?: string): Promise<string[]> {
	const umzug = new Umzug({
		migrations: migrations.map(({ name, statements }) => ({
			name,
			up: () =>
				inTransaction(database, async (transaction) => {
					for (const statement of statements)
						await database.sequelize.query(statement, { transaction });
				})
		})),
		storage: journal(database),
		logger: undefined
	});
	const done = await umzug.up(upTo ? { to: upTo } : {});
	return done.map((one) => one.name);
}

/** Which migrations a file has had, kept in the file itself. */
function journal(database: Database): UmzugStorage {
	const { sequelize } = database;
	return {
		async executed() {
			await sequelize.query('CREATE TABLE IF NOT EXISTS migrations (name TEXT PRIMARY KEY)');
			const rows = await sequelize.query<{ name: string }>('SELECT name FROM migrations', {
				type: QueryTypes.SELECT
			});
			return rows.map((row) => row.name);
		},
		async logMigration({ name }) {
			await sequelize.query('INSERT INTO migrations (name) VALUES (:name)', {
				replacements: { name }
			});
		},
		async unlogMigration({ name }) {
			await sequelize.query('DELETE FROM migrations WHERE name = :name', {
				replacements: { name }
			});
		}
	};
}
