import { lessonReadings, watchRecords } from '../models';
import { find, insert, update } from '../rows';
import type { RowOf } from '../table';
import type { SchoolScope } from '../scope';

type Watched = Omit<RowOf<typeof watchRecords>, 'schoolId'>;
type Reading = Omit<RowOf<typeof lessonReadings>, 'schoolId'>;

export function watchRecord(
	scope: SchoolScope,
	enrolmentId: string,
	lessonId: string,
	filmHash: string
) {
	return find(scope, watchRecords, { enrolmentId, lessonId, filmHash });
}

export async function keepWatched(scope: SchoolScope, row: Watched): Promise<void> {
	const { enrolmentId, lessonId, filmHash, ...change } = row;
	const where = { enrolmentId, lessonId, filmHash };
	if ((await update(scope, watchRecords, where, change)) === 0)
		await insert(scope, watchRecords, row);
}

export function lessonReading(scope: SchoolScope, enrolmentId: string, lessonId: string) {
	return find(scope, lessonReadings, { enrolmentId, lessonId });
}

/** Keeps the first opening; the revision and the reading are the newest. */
export async function keepReading(scope: SchoolScope, row: Reading): Promise<void> {
	const { enrolmentId, lessonId, revisionId, readAt } = row;
	const changed = await update(
		scope,
		lessonReadings,
		{ enrolmentId, lessonId },
		{ revisionId, readAt }
	);
	if (changed === 0) await insert(scope, lessonReadings, row);
}
