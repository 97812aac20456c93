/** What another language has to say for a set of English texts: the same keys, and the same things to put in. */
export type Translated<English> = {
  readonly [Key in keyof English]: English[Key] extends (...given: infer Given) => string
    ? (...given: Given) => string
    : string;
};
