/** Printed in the README: whoever reads it could sign in, so it opens nothing on a public address. */
export const demoPassword = 'averholm-demo';
