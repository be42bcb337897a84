import type { Evidence } from '../evidence';
import { dayWords, hoursWords, howWords } from '../words';
import type { AwardRule, Verdict } from './rule';

type Finding = { met: boolean; words: string };

const met = (words: string): Finding => ({ met: true, words });
const lacking = (words: string): Finding => ({ met: false, words });

/** Every needed step done, every job sheet judged competent, the hours at the bench, every outcome shown. */
export const evidenceComplete: AwardRule = {
	key: 'evidence-complete',
	version: 1,
	words:
		'Every lesson read, every quiz passed, every job sheet judged competent, the bench hours that the course asks for, and each outcome shown by at least one of them.',
	decide(evidence: Evidence): Verdict {
		const findings = [
			...lessonFindings(evidence),
			...quizFindings(evidence),
			...taskFindings(evidence),
			...caseFindings(evidence),
			benchFinding(evidence.bench),
			...outcomeFindings(evidence)
		];
		const missing = findings.filter((one) => !one.met).map((one) => one.words);
		return {
			met: missing.length === 0,
			because: findings.filter((one) => one.met).map((one) => one.words),
			missing
		};
	}
};

function needed({ steps }: Evidence, kind: Evidence['steps'][number]['kind']) {
	return steps.filter((step) => step.needed && step.kind === kind);
}

function lessonFindings(evidence: Evidence): Finding[] {
	const lessons = needed(evidence, 'lesson');
	const open = lessons.filter((lesson) => lesson.state !== 'competent');
	if (lessons.length === 0) return [];
	if (open.length > 0)
		return open.map((lesson) => lacking(`Lesson not finished: ${lesson.title}.`));
	return [met(lessonWords(lessons.length))];
}

function lessonWords(count: number): string {
	if (count === 1) return 'The lesson was read.';
	return count === 2 ? 'Both lessons were read.' : `All ${count} lessons were read.`;
}

function quizFindings(evidence: Evidence): Finding[] {
	return needed(evidence, 'quiz').map(({ key, title }) => {
		const best = evidence.quizzes.find((quiz) => quiz.stepKey === key);
		if (!best) return lacking(`Quiz not sat: ${title}.`);
		return { met: best.passed, words: `Quiz ${title}. ${best.words}` };
	});
}

function taskFindings(evidence: Evidence): Finding[] {
	const sheets = needed(evidence, 'job-sheet');
	// Quizzes show knowledge; competence is shown at the bench.
	if (sheets.length === 0)
		return [lacking('The course has no job sheet, so nothing was shown at a bench.')];
	return sheets.map(({ key, title, state }) => {
		const task = evidence.tasks.find((one) => one.stepKey === key);
		if (!task)
			return lacking(
				state === 'waiting'
					? `Job sheet not marked yet: ${title}.`
					: `Job sheet not handed in: ${title}.`
			);
		if (task.decision !== 'competent')
			return lacking(`Job sheet ${title}: not yet competent at attempt ${task.attempt}.`);
		return met(
			`Job sheet ${title}, on ${task.engine}, ${howWords(task)}: competent at attempt ${task.attempt}, ${dayWords(task.decidedOn)}.`
		);
	});
}

function caseFindings(evidence: Evidence): Finding[] {
	return needed(evidence, 'case').map(({ title, state }) =>
		state === 'competent' ? met(`Case worked: ${title}.`) : lacking(`Case not worked: ${title}.`)
	);
}

function benchFinding({ minutes, neededMinutes }: Evidence['bench']): Finding {
	const recorded = `${hoursWords(minutes)} at the bench recorded; the course asks for ${hoursWords(neededMinutes)}.`;
	return { met: minutes >= neededMinutes, words: recorded };
}

function outcomeFindings(evidence: Evidence): Finding[] {
	const done = new Set(
		evidence.steps.filter((step) => step.state === 'competent').map((step) => step.key)
	);
	const open = evidence.outcomes.filter(
		(outcome) => !outcome.shownBySteps.some((key) => done.has(key))
	);
	if (open.length > 0)
		return open.map((outcome) => lacking(`Outcome not shown yet: ${outcome.words}`));
	const count = evidence.outcomes.length;
	return count === 0 ? [] : [met(`Each of the ${count} outcomes was shown by a finished step.`)];
}
