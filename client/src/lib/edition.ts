import { remembered, useRemembered } from './remembered';

export type Edition = 'day' | 'night';

const preferred = (): Edition =>
  typeof matchMedia === 'function' && matchMedia('(prefers-color-scheme: dark)').matches ? 'night' : 'day';

/** The reader's edition: as chosen here, else as the system prefers. */
export const edition = remembered<Edition>('diffolio.edition', preferred, (stored) =>
  stored === 'day' || stored === 'night' ? stored : undefined,
);

export const useEdition = (): Edition => useRemembered(edition);

/** Writes the edition on the document, where the colours look for it. */
export function applyEdition(): void {
  const night = edition.get() === 'night';
  document.documentElement.classList.toggle('dark', night);
  document.documentElement.style.colorScheme = night ? 'dark' : 'light';
}

export function toggleEdition(): void {
  edition.set(edition.get() === 'day' ? 'night' : 'day');
  applyEdition();
}
