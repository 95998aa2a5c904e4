/** A sentence with its `{names}` replaced. */
export const fill = (sentence: string, values: Readonly<Record<string, string | number>>): string =>
  sentence.replace(/\{(\w+)\}/g, (whole, name: string) => (name in values ? String(values[name]) : whole));
