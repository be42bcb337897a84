import type { MailSchool } from './kind';

/** In the school's own time where there is one; the zone is always said. */
export function instantWords(at: string, school: MailSchool | undefined): string {
	return new Intl.DateTimeFormat(school?.locale ?? 'en-GB', {
		dateStyle: 'long',
		timeStyle: 'long',
		timeZone: school?.timeZone ?? 'UTC'
	}).format(new Date(at));
}
