/** The most looks for which a schedule is worked out. */
export const MOST_LOOKS = 10_000;
