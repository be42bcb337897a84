import type { z } from 'zod';

/** What is wrong with a field, in words for the person who typed it; a rule's own words stand. */
export function issueWords(issue: z.core.$ZodRawIssue): string | undefined {
	switch (issue.code) {
		case 'invalid_type':
			return issue.input === undefined ? 'Fill this in.' : 'This cannot stand here.';
		case 'invalid_value':
			return issue.input === undefined ? 'Choose one.' : 'This is none of the choices.';
		case 'too_small':
			if (issue.origin === 'array') return `At least ${issue.minimum}.`;
			if (issue.origin === 'string') return 'Fill this in.';
			return issue.inclusive ? `Not below ${issue.minimum}.` : `Above ${issue.minimum}.`;
		case 'too_big':
			if (issue.origin === 'array') return `At most ${issue.maximum}.`;
			if (issue.origin === 'string') return `At most ${issue.maximum} characters.`;
			return issue.inclusive ? `Not above ${issue.maximum}.` : `Below ${issue.maximum}.`;
		default:
			return undefined;
	}
}
