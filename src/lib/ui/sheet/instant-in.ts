/** An instant as people of a place write it. */
export function instantIn(locale: string, timeZone: string) {
	const format = new Intl.DateTimeFormat(locale, {
		dateStyle: 'medium',
		timeStyle: 'short',
		timeZone
	});
	return (instant: string) => format.format(new Date(instant));
}
