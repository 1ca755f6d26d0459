/** Minutes that a sign-in link works. */
export const LINK_MINUTES = 20;
