import type { Actor } from '$lib/domain/actor';
import type { JobSheet } from '$lib/domain/job-sheets/schema';
import { tagQrText, tagWords } from '$lib/domain/job-sheets/evidence-tag';
import type { Operation } from '$lib/domain/job-sheets/submission';
import type { Random } from '$lib/kernel/random/random';
import { revisionsOfAttempt } from '../data/queries/attempt-context';
import { findSubmission } from '../data/queries/submissions';
import { schoolScope } from '../data/scope';
import { drawAsJpeg } from '../gateways/images/draw';
import { signMark } from '../services/marking/sign-mark';
import { takeForMarking } from '../services/marking/take-for-marking';
import { addPhotograph } from '../services/submissions/add-photograph';
import { handInSubmission } from '../services/submissions/hand-in-submission';
import { openSubmission } from '../services/submissions/open-submission';
import { workOnSubmission } from '../services/submissions/work-on-submission';
import { photographOf } from './photograph';
import type { Stage } from './stage';
import { argumentFor, findingFor, notesFor } from './words';

type Where = { schoolId: string; enrolmentId: string; stepKey: string };
export type Ending = 'open' | 'handed-in' | 'competent' | 'not-yet';

/** An attempt from its tag to its mark: photographs drawn, readings as a worn pin gives them. */
export async function playJobSheet(
	stage: Stage,
	student: Actor,
	marker: Actor,
	where: Where,
	{ random, ending }: { random: Random; ending: Ending }
): Promise<void> {
	const { schoolId, ...at } = where;
	const act = (name: string) =>
		stage.as(student, schoolId, `${at.enrolmentId}/${at.stepKey}/${name}`);
	const { submissionId } = await openSubmission(act('open'), at);
	const scope = schoolScope(stage.house.database, schoolId, null);
	const attempt = await findSubmission(scope, submissionId);
	if (attempt?.state !== 'open') return;
	const { jobSheet } = await revisionsOfAttempt(scope, attempt);
	const tag = { qrText: tagQrText(attempt.tagCode), words: tagWords(attempt.tagCode) };
	const shots =
		ending === 'open' ? jobSheet.shots.slice(0, 1) : jobSheet.shots.filter((one) => one.required);
	const photographs: Record<string, string> = {};
	for (const shot of shots) {
		const jpeg = await drawAsJpeg(photographOf(shot.key, tag, attempt.id), 1600);
		const { photographId } = await addPhotograph(act(`photograph/${shot.key}`), {
			submissionId,
			shotKey: shot.key,
			file: once(jpeg)
		});
		photographs[shot.key] = photographId;
	}
	const operations = operationsFor(stage, jobSheet, attempt.id, photographs, random);
	const some = ending === 'open' ? operations.filter(isMeasured).slice(0, 4) : operations;
	const { version } = await workOnSubmission(act('work'), {
		submissionId,
		baseVersion: attempt.version,
		operations: some
	});
	if (ending === 'open') return;
	await handInSubmission(act('hand-in'), { submissionId, baseVersion: version });
	if (ending === 'handed-in') return;
	await mark(stage, marker, schoolId, submissionId, jobSheet, ending);
}

/** What an attempt just begun holds; its finding waits for the photograph it is pinned in. */
const isMeasured = ({ kind }: Operation) => kind === 'reading' || kind === 'note';

async function* once(bytes: Buffer): AsyncGenerator<Uint8Array> {
	await Promise.resolve();
	yield bytes;
}

function operationsFor(
	stage: Stage,
	jobSheet: JobSheet,
	attemptId: string,
	photographs: Record<string, string>,
	random: Random
): Operation[] {
	const readings = jobSheet.grids.flatMap((grid) => {
		const bore = /bearingBore$/i.test(grid.dimension);
		const middle = bore
			? grid.plausible.leastMm + 0.135
			: (grid.plausible.leastMm + grid.plausible.mostMm) / 2 + 0.168;
		return grid.rows.flatMap((_, row) =>
			grid.columns.map((_, column): Operation => ({
				kind: 'reading',
				grid: grid.key,
				row,
				column,
				valueMm: Number(
					(
						middle -
						(bore ? 0 : column * 0.005 + row * 0.003) +
						random.integer(-2, 2) / 1000
					).toFixed(3)
				)
			}))
		);
	});
	const notes = jobSheet.notes.map((note): Operation => ({
		kind: 'note',
		key: note.key,
		words: notesFor(note.key)
	}));
	const [shot = ''] = Object.keys(photographs).filter((key) => key !== 'as-received');
	const finding = findingFor(shot);
	return [
		...readings,
		...notes,
		{
			kind: 'finding',
			finding: {
				id: stage.named(`finding/${attemptId}`),
				photographId: photographs[shot] ?? '',
				...finding
			}
		},
		{ kind: 'argument', argument: argumentFor(jobSheet.key) },
		...(random.unit() < 0.3
			? [
					{
						kind: 'help' as const,
						help: { alone: false, words: 'A classmate held the shaft while I measured.' }
					}
				]
			: [])
	];
}

async function mark(
	stage: Stage,
	marker: Actor,
	schoolId: string,
	submissionId: string,
	jobSheet: JobSheet,
	ending: 'competent' | 'not-yet'
): Promise<void> {
	const act = (name: string) => stage.as(marker, schoolId, `${submissionId}/${name}`);
	await takeForMarking(act('take'), { submissionId });
	const witnessId =
		marker.kind === 'account'
			? (marker.memberships.find((one) => one.schoolId === schoolId)?.personId ?? null)
			: null;
	const weak = jobSheet.scheme.criteria.findIndex((one) => !one.mustPass && one.leastLevel > 1);
	await signMark(act('sign'), {
		submissionId,
		words:
			ending === 'competent'
				? 'Clear work. Keep writing each reading down before the next.'
				: 'Most of this stands. Do again what is named, nothing else.',
		rows: jobSheet.scheme.criteria.map((criterion, index) => {
			const short = ending === 'not-yet' && index === weak;
			return {
				criterion: criterion.key,
				level: short ? criterion.leastLevel - 2 : criterion.leastLevel,
				words: short ? 'The damage cannot be told from the light on the part.' : '',
				witnessId: criterion.needsWitness ? witnessId : null
			};
		})
	});
}
