/** What this build calls itself. The revision is raised whenever any result changes beyond its stated accuracy. */
export const RELEASE_NAME = "Weirmark";
export const RELEASE_VERSION = "0.1.0";
export const NUMBERS_REVISION = 1;
