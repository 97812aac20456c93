/**
 * A pure function of numbers that keeps its last answers: several cells ask for the same factor, and a factor is dear.
 *
 * Edges      −0 and 0 share an answer. A thrown error is not kept.
 * Method     The oldest answer goes when `most` are kept, so that a long session doesn't grow.
 */
export function remembered<Arguments extends readonly number[], Answer>(
  compute: (...args: Arguments) => Answer,
  most = 256,
): (...args: Arguments) => Answer {
  const answers = new Map<string, Answer>();
  return (...args) => {
    const key = args.join();
    const known = answers.get(key);
    if (known !== undefined) return known;
    const answer = compute(...args);
    if (answers.size >= most) answers.delete(answers.keys().next().value!);
    answers.set(key, answer);
    return answer;
  };
}
