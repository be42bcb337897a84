import { fileURLToPath } from 'node:url';
import { join } from 'node:path';

/** Where the checkout lies, whatever folder the command was given in. */
export const project = fileURLToPath(new URL('../../..', import.meta.url));

/** @param {string[]} parts */
export const inProject = (...parts) => join(project, ...parts);
