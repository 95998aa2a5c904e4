/** A gas pair as a title: `Ethanol + nitrogen`. */
export function pairTitle(substances: readonly { readonly name: string }[]): string {
  const title = substances.map(({ name }) => name).join(' + ');
  return title.charAt(0).toUpperCase() + title.slice(1);
}
