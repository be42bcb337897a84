export const stepStates = ['not-begun', 'under-way', 'waiting', 'sent-back', 'competent'] as const;

/** How far one student is with one step: one mark in the progress chart. */
export type StepState = (typeof stepStates)[number];

export const stepStateWords: Record<StepState, string> = {
	'not-begun': 'Not begun',
	'under-way': 'Under way',
	waiting: 'Waiting to be marked',
	'sent-back': 'Sent back',
	competent: 'Competent'
};
