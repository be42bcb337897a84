import type { Component } from 'svelte';
import type { KindName } from '$lib/domain/questions/kind-names';
import NumberWithUnit from './NumberWithUnit.svelte';
import Ruling from './Ruling.svelte';
import SeveralChoices from './SeveralChoices.svelte';
import SingleChoice from './SingleChoice.svelte';
import TighteningOrder from './TighteningOrder.svelte';

export type QuestionProps = {
	face: unknown;
	response: unknown;
	name: string;
	onrespond?: (response: unknown) => void;
};

/** One line a kind; forgetting one does not compile. */
export const questionComponents: Record<KindName, Component<QuestionProps>> = {
	'single-choice': SingleChoice as unknown as Component<QuestionProps>,
	'several-choices': SeveralChoices as unknown as Component<QuestionProps>,
	'number-with-unit': NumberWithUnit as unknown as Component<QuestionProps>,
	'tightening-order': TighteningOrder as unknown as Component<QuestionProps>,
	ruling: Ruling as unknown as Component<QuestionProps>
};
