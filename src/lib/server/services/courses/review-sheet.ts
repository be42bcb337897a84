import canonicalize from 'canonicalize';
import { changeWords } from '$lib/domain/data-sheets/change-words';
import { changesBetween } from '$lib/domain/data-sheets/changes';
import { checkSheet, type Finding } from '$lib/domain/data-sheets/consistency/check-sheet';
import type { SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import { readDraft } from '$lib/domain/data-sheets/draft/read-draft';
import { stampFor } from '$lib/domain/data-sheets/draft/stamp';
import { keysMissed, questionsLost, touchedBy } from '$lib/domain/data-sheets/impact';
import { lacksFor } from '$lib/domain/data-sheets/lacks';
import { nameIn } from '$lib/domain/data-sheets/name-in';
import { dataSheetSchema, type DataSheet } from '$lib/domain/data-sheets/schema';
import { useWords } from '$lib/domain/data-sheets/use-words';
import { keysOfJobSheet, keysOfQuestion, usesOf } from '$lib/domain/data-sheets/uses';
import type { DraftRow } from '../../data/queries/drafts';
import type { Revision } from '../../data/queries/publications';
import { schoolById } from '../../data/queries/schools';
import {
	openAttemptsOn,
	openSittingsFrom,
	questionsDrawnIn,
	taughtFrom
} from '../../data/queries/sheet-usage';
import type { SchoolScope } from '../../data/scope';

type Under = { key: string; draft: DraftRow; standing: Revision | undefined; at: Date };

const nothingSeen = {
	refused: [],
	warnings: [],
	changes: [],
	touched: [],
	sittings: [],
	attempts: []
};

/**
 * What publishing a draft comes to: the sheet that it would be, why it is refused, what must be
 * read first, and whatever its changes touch.
 */
export async function reviewSheet(scope: SchoolScope, { key, draft, standing, at }: Under) {
	const before = standing && dataSheetSchema.parse(standing.body);
	const [school, taught] = await Promise.all([
		schoolById(scope, scope.schoolId),
		taughtFrom(scope, key)
	]);
	const stamp = stampFor(key, before?.revision, at, school?.timeZone ?? 'UTC');
	const { faults, sheet } = readDraft(draft.body as SheetDraft, stamp);
	if (!sheet) return { stamp, before, faults, sheet, ...nothingSeen };
	const uses = usesOf(taught);
	const findings = checkSheet(sheet);
	const worded = ({ at: key, says }: Finding) => `${nameIn(sheet, key)}: ${says}.`;
	const changes = changesBetween(before, sheet).map(changeWords);
	const refused = [
		...findings.filter((one) => one.severity === 'refused').map(worded),
		...keysMissed(sheet, uses).map(
			({ key: missed, uses: by }) =>
				`${missed} is not in the sheet any more, and is used by ${by.map(useWords).join('; ')}.`
		),
		...questionsLost(taught.questions, before, sheet).map(
			(one) => `The question ${one.key} would have no answer any more: ${one.because}.`
		),
		...taught.jobSheets.flatMap((jobSheet) =>
			lacksFor(sheet, jobSheet)
				.filter(
					(lack) => !before || !lacksFor(before, jobSheet).some((old) => old.key === lack.key)
				)
				.map((lack) => `For the job sheet ${jobSheet.title}, ${lack.says}.`)
		),
		...(before && saysTheSame(before, sheet)
			? [`Nothing in this draft differs from revision ${before.revision}.`]
			: []),
		...((draft.basedOnRevisionId ?? undefined) !== standing?.id
			? ['Another revision was published since this draft was begun. Begin a new one from it.']
			: []),
		...(stamp.revision === '' ? ['There is no revision letter after ZZ.'] : [])
	];
	return {
		stamp,
		before,
		faults,
		sheet,
		refused,
		warnings: findings.filter((one) => one.severity === 'warned').map(worded),
		changes,
		touched: touchedBy(changes, uses),
		...(await openWork(scope, key, changes))
	};
}

type Keyed = { key: string };

/** Sittings and attempts under way that stand on a value that changes. They keep their revision. */
async function openWork(scope: SchoolScope, key: string, changes: readonly Keyed[]) {
	const changed = new Set(changes.map((one) => one.key));
	const [sittings, attempts] = await Promise.all([
		openSittingsFrom(scope, key),
		openAttemptsOn(scope, key)
	]);
	const drawn = await questionsDrawnIn(
		scope,
		sittings.map((one) => one.id)
	);
	const touches = (keys: readonly string[]) => keys.some((one) => changed.has(one));
	return {
		sittings: sittings
			.map((one) => ({
				...one,
				questions: drawn.filter(
					({ sittingId, question }) => sittingId === one.id && touches(keysOfQuestion(question))
				).length
			}))
			.filter((one) => one.questions > 0),
		attempts: attempts
			.filter((one) => touches(keysOfJobSheet(one.jobSheet)))
			.map(({ jobSheet, ...one }) => ({ ...one, title: jobSheet.title }))
	};
}

function saysTheSame(before: DataSheet, after: DataSheet): boolean {
	const { revision, issuedOn } = before;
	return canonicalize(before) === canonicalize({ ...after, revision, issuedOn });
}
