import { publications, revisions, type PublicationKind } from '../models';
import { find, insert, select, sql } from '../rows';
import type { SchoolScope } from '../scope';

export type Revision = {
	id: string;
	publicationId: string;
	kind: PublicationKind;
	key: string;
	number: number;
	title: string;
	hash: string;
	body: unknown;
	publishedAt: string;
};

const joined = `SELECT r.id, r.publicationId, p.kind, p.key, r.number, r.title, r.hash, r.body, r.publishedAt
	FROM revisions r JOIN publications p ON p.schoolId = r.schoolId AND p.id = r.publicationId
	WHERE r.schoolId = :schoolId`;

async function read(scope: SchoolScope, statement: string, values: Record<string, unknown>) {
	const rows = await sql<Omit<Revision, 'body'> & { body: string }>(scope, statement, values);
	return rows.map((row): Revision => ({ ...row, body: JSON.parse(row.body) }));
}

/** The newest revision of each publication of a kind, or of the named keys only. */
export function newestRevisions(
	scope: SchoolScope,
	kind: PublicationKind,
	keys?: readonly string[]
) {
	if (keys?.length === 0) return Promise.resolve([]);
	return read(
		scope,
		`${joined} AND p.kind = :kind ${keys ? 'AND p.key IN (:keys)' : ''}
		 AND r.number = (SELECT max(number) FROM revisions n WHERE n.schoolId = r.schoolId AND n.publicationId = r.publicationId)
		 ORDER BY p.key`,
		{ kind, keys }
	);
}

export async function newestRevision(scope: SchoolScope, kind: PublicationKind, key: string) {
	return (await newestRevisions(scope, kind, [key]))[0];
}

export async function revisionById(scope: SchoolScope, id: string) {
	return (await read(scope, `${joined} AND r.id = :id`, { id }))[0];
}

export function revisionsByIds(scope: SchoolScope, ids: readonly string[]) {
	if (ids.length === 0) return Promise.resolve([]);
	return read(scope, `${joined} AND r.id IN (:ids)`, { ids });
}

/** All revisions of one publication, the newest first. */
export function revisionsOf(scope: SchoolScope, kind: PublicationKind, key: string) {
	return read(scope, `${joined} AND p.kind = :kind AND p.key = :key ORDER BY r.number DESC`, {
		kind,
		key
	});
}

/**
 * Publishes a body under a key. The same content again is no new revision.
 * @returns the revision that now stands, and whether it is new
 */
export async function publish(
	scope: SchoolScope,
	thing: { kind: PublicationKind; key: string; title: string; hash: string; body: unknown },
	newId: () => string,
	at: string
): Promise<{ revisionId: string; publicationId: string; isNew: boolean }> {
	const { kind, key } = thing;
	let publication = await find(scope, publications, { kind, key });
	if (!publication) {
		publication = { schoolId: scope.schoolId, id: newId(), kind, key, createdAt: at };
		await insert(scope, publications, publication);
	}
	const publicationId = publication.id;
	const newest = (
		await select(scope, revisions, { publicationId }, { order: [['number', 'desc']], limit: 1 })
	)[0];
	if (newest?.hash === thing.hash) return { revisionId: newest.id, publicationId, isNew: false };
	const revisionId = newId();
	await insert(scope, revisions, {
		id: revisionId,
		publicationId,
		number: (newest?.number ?? 0) + 1,
		title: thing.title,
		hash: thing.hash,
		body: thing.body,
		publishedAt: at
	});
	return { revisionId, publicationId, isNew: true };
}
