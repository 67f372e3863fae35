/** The choices of a list of words. */
export const Options = <K extends string>({ values, words }: { values: readonly K[]; words: Record<K, string> }) =>
  values.map((value) => (
    <option key={value} value={value}>
      {words[value]}
    </option>
  ));
