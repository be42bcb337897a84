import type { Actor } from '$lib/domain/actor';
import type { Answer } from '$lib/domain/questions/kind';
import type { KindName } from '$lib/domain/questions/kind-names';
import { kindOf } from '$lib/domain/questions/registry';
import type { Random } from '$lib/kernel/random/random';
import { findSitting } from '../data/queries/sittings';
import { schoolScope } from '../data/scope';
import { beginSitting } from '../services/quizzes/begin-sitting';
import { handInSitting } from '../services/quizzes/end-sitting';
import { openOnDevice } from '../services/quizzes/open-on-device';
import { satQuestions } from '../services/quizzes/quiz-step';
import { saveResponse } from '../services/quizzes/save-response';
import type { Stage } from './stage';

type Where = { schoolId: string; enrolmentId: string; stepKey: string };

/** Sits a quiz as somebody who knows `ability` of it, and hands it in. */
export async function playQuiz(
	stage: Stage,
	who: Actor,
	where: Where,
	{ ability, random, handIn }: { ability: number; random: Random; handIn: boolean }
): Promise<void> {
	const { schoolId, ...at } = where;
	const act = (name: string) => stage.as(who, schoolId, `${at.enrolmentId}/${at.stepKey}/${name}`);
	const { sittingId } = await beginSitting(act('begin'), at);
	const { epoch } = await openOnDevice(act('open'), { sittingId, device: 'Firefox on Android' });
	const scope = schoolScope(stage.house.database, schoolId, null);
	const sitting = await findSitting(scope, sittingId);
	if (sitting?.state !== 'open') return;
	let number = 0;
	for (const { id, question, seed, figures } of await satQuestions(scope, sitting)) {
		const kind = kindOf(question.kind);
		const drawn = kind.draw(question.body, seed, figures);
		if (!drawn.ok) throw new Error(drawn.because);
		if (!handIn && number > 5) break;
		const knows = random.unit() < ability;
		const response = responseFor(question.kind, kind.answer(question.body, drawn.value), knows);
		number += 1;
		await saveResponse(act(`save/${id}`), { sittingId, questionId: id, epoch, number, response });
	}
	if (handIn) await handInSitting(act('hand-in'), { sittingId });
}

/** The right answer as a response, or a usual slip of its kind. */
function responseFor(kind: KindName, answer: Answer, knows: boolean): unknown {
	const [right = 'a'] = answer.optionIds ?? [];
	switch (kind) {
		case 'single-choice':
			return { choice: knows ? right : right === 'a' ? 'b' : 'a' };
		case 'several-choices':
			return { choices: knows ? answer.optionIds : [right] };
		case 'ruling':
			return { ruling: knows ? right : right === 'within' ? 'too-close' : 'within' };
		case 'tightening-order':
			return { order: knows ? answer.order : [...(answer.order ?? [])].sort() };
		case 'number-with-unit': {
			const [, figure = '0', unit = ''] = /^(−?[\d.]+)\s*(.*)$/.exec(answer.words) ?? [];
			const value = Number(figure.replace('−', '-'));
			return { value: String(knows ? value : value * 10), unit };
		}
	}
}
