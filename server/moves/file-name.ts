const MOST_SIGNS = 80;

/**
 * A title as the beginning of a file name that every system takes.
 *
 * @returns letters of any script, digits, hyphens and underscores; `move` where nothing is left
 */
export function safeFileName(title: string): string {
  const words = title.normalize('NFC').replace(/[^\p{L}\p{M}\p{N}_]+/gu, '-');
  const name = [...words]
    .slice(0, MOST_SIGNS)
    .join('')
    .replace(/^-+|-+$/g, '');
  return name || 'move';
}
