/**
 * `later` may be tried again; `refused` will not change by trying; `unsure` may or may not have
 * arrived, which is shown to people and never guessed.
 */
export type Delivery =
	| { kind: 'sent'; response: string; because?: undefined }
	| { kind: 'refused' | 'later' | 'unsure'; because: string };

/** Answers about our own signing in: a wrong setting must not use up every letter that waits. */
const aboutSigningIn = new Set([530, 534, 535, 538]);

/** @param begun whether the letter itself had begun to leave */
export function outcomeOf(error: Error, begun: boolean): Delivery {
	const { responseCode, command, code } = error as Error & {
		responseCode?: number;
		command?: string;
		code?: string;
	};
	const because = error.message.slice(0, 300);
	if (responseCode === undefined) {
		if (begun) return { kind: 'unsure', because };
		// The address itself cannot be written into the dialogue.
		if (code === 'EENVELOPE' && command === 'API') return { kind: 'refused', because };
		return { kind: 'later', because };
	}
	const aboutTheLetter = ['MAIL FROM', 'RCPT TO', 'DATA'].includes(command ?? '');
	if (responseCode >= 500 && aboutTheLetter && !aboutSigningIn.has(responseCode))
		return { kind: 'refused', because };
	return { kind: 'later', because };
}
