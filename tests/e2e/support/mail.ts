import { expect } from '@playwright/test';

export type Letter = {
	id: string;
	at: string;
	to: string[];
	from: string;
	subject: string;
	messageId: string | null;
	text: string;
	html: string;
	links: string[];
};

/** The mailbox as the addressee sees it. */
export type Mailbox = {
	/** Newest first. */
	lettersTo: (address: string) => Promise<Letter[]>;
	/** Waits for a letter with these words in its subject; the newest one. */
	letterTo: (address: string, subject: RegExp) => Promise<Letter>;
	/** Waits for it and gives the first link in it that leads into this path. */
	linkTo: (address: string, subject: RegExp, path: RegExp) => Promise<string>;
};

export function mailboxAt(url: string): Mailbox {
	async function lettersTo(address: string): Promise<Letter[]> {
		const response = await fetch(`${url}/messages?to=${encodeURIComponent(address)}`);
		return response.json();
	}
	async function letterTo(address: string, subject: RegExp): Promise<Letter> {
		let found: Letter | undefined;
		await expect
			.poll(
				async () => {
					const letters = await lettersTo(address);
					found = letters.find((one) => subject.test(one.subject));
					return found ? 'found' : letters.map((one) => one.subject);
				},
				{ timeout: 20_000, message: `a letter to ${address} about ${subject}` }
			)
			.toBe('found');
		if (!found) throw new Error('unreachable: the poll ended with a letter');
		return found;
	}
	return {
		lettersTo,
		letterTo,
		async linkTo(address, subject, path) {
			const { links, text } = await letterTo(address, subject);
			const link = links.find((one) => path.test(new URL(one).pathname));
			if (!link) throw new Error(`No link into ${path} in:\n${text}`);
			return link;
		}
	};
}
