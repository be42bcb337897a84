import { certificateCode } from '$lib/domain/certificates/code';
import type { Evidence } from '$lib/domain/certificates/evidence';
import { faceOf } from '$lib/domain/certificates/face';
import { evidenceComplete } from '$lib/domain/certificates/rules/evidence-complete';

export const evidence: Evidence = {
	steps: [
		{
			key: 'strip',
			title: 'Safe strip-down and tagging',
			kind: 'lesson',
			state: 'competent',
			needed: true
		},
		{
			key: 'pins',
			title: 'Crankpins and clearances',
			kind: 'lesson',
			state: 'competent',
			needed: true
		},
		{
			key: 'quiz-1',
			title: 'Torque and clearances',
			kind: 'quiz',
			state: 'competent',
			needed: true
		},
		{
			key: 'sheet-1',
			title: 'Measure a crankpin',
			kind: 'job-sheet',
			state: 'competent',
			needed: true
		},
		{
			key: 'sheet-2',
			title: 'Argue a spun shell to its cause',
			kind: 'job-sheet',
			state: 'competent',
			needed: true
		},
		{
			key: 'case-1',
			title: 'The launch that stopped at 61 hours',
			kind: 'case',
			state: 'not-begun',
			needed: false
		}
	],
	quizzes: [
		{
			stepKey: 'quiz-1',
			title: 'Torque and clearances',
			passed: true,
			words: 'Passed: 9 of 10 points, 90 %. The cut score is 70 %.'
		}
	],
	tasks: [
		{
			stepKey: 'sheet-1',
			title: 'Measure a crankpin',
			engine: 'AV3-1150, stand 4',
			how: 'alone',
			share: null,
			attempt: 2,
			decision: 'competent',
			decidedOn: '2026-03-04'
		},
		{
			stepKey: 'sheet-2',
			title: 'Argue a spun shell to its cause',
			engine: 'AV3-1150, stand 2',
			how: 'pair',
			share: 'took the readings of pins 1 and 3',
			attempt: 1,
			decision: 'competent',
			decidedOn: '2026-03-18'
		}
	],
	bench: { minutes: 750, neededMinutes: 720 },
	outcomes: [
		{
			words: 'Strip a three-cylinder engine without losing its evidence.',
			shownBySteps: ['strip', 'sheet-1']
		},
		{
			words: 'Rule a crankpin for building or for running again, with the uncertainty stated.',
			shownBySteps: ['sheet-1']
		},
		{
			words: 'Argue damage on a bench back to its root cause and say what was ruled out.',
			shownBySteps: ['sheet-2']
		}
	],
	notAssessed: ['Valve train and cylinder head.', 'Work on running engines.', 'Diesel injection.']
};

export const occasion = {
	code: certificateCode(Uint8Array.from([7, 91, 203, 18, 144, 250, 33])),
	personName: 'Željka Ødegård-Nguyễn',
	school: { name: 'Averholm Trade School', place: 'Averholm' },
	course: { title: 'Crankpins and shells', revision: 'r3' },
	awardedOn: '2026-03-20',
	decidedBy: { name: 'Halvard Quist', schoolName: 'Korrig Point' }
};

export const face = faceOf(occasion, evidence, evidenceComplete);
