import { z } from 'zod';

/** Length is what counts (NIST SP 800-63B): no rules about kinds of characters. */
export const newPassword = z
	.string()
	.min(12, 'Use at least 12 characters. A few plain words do well.')
	.max(200, 'Use at most 200 characters.');
