/** Set when the program is bundled, and by the test runner: what package.json says. */
declare const COUPLET_VERSION: string;

/** The version of this program: that of package.json. */
export const VERSION = COUPLET_VERSION;
