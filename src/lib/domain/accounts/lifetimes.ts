/** How long things hold: said on pages and in letters, and kept by the server. */
export const lifetimes = {
	sessionDays: 30,
	signInLinkMinutes: 15,
	passwordLinkMinutes: 60,
	roleInvitationDays: 14
} as const;
