import type { ProblemCode, ProblemParameters } from '$lib/domain/problem';

export type Question<In> = { number: number; input: In };

export type Answer<Out> =
	| { number: number; kind: 'done'; value: Out }
	| {
			number: number;
			kind: 'problem';
			code: ProblemCode;
			words: string;
			parameters: ProblemParameters;
	  }
	| { number: number; kind: 'fault'; text: string };
