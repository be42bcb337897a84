/** Every row inside a school says which, and the school must exist. */
export const schoolId = 'schoolId TEXT NOT NULL REFERENCES schools(id)';

/** A reference that can only reach a row of the same school: the database itself refuses others. */
export function inSchool(column: string, table: string, target = 'id'): string {
	return `FOREIGN KEY (schoolId, ${column}) REFERENCES ${table}(schoolId, ${target})`;
}

/** Triggers that refuse to change or delete what must stand as it was written. */
export function appendOnly(table: string): string[] {
	return ['UPDATE', 'DELETE'].map(
		(verb) => `CREATE TRIGGER ${table}_no_${verb.toLowerCase()} BEFORE ${verb} ON ${table}
			BEGIN SELECT RAISE(ABORT, '${table} are never changed or deleted'); END`
	);
}
