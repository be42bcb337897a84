import type { StepState } from './step-state';

type Standing = { state: StepState };

/**
 * What a student does next: first what was sent back, then what is begun, then the first step
 * not begun. What waits for a marker is nobody's next step.
 */
export function nextStep<S extends Standing>(steps: readonly S[]): S | undefined {
	const first = (state: StepState) => steps.find((step) => step.state === state);
	return first('sent-back') ?? first('under-way') ?? first('not-begun');
}
