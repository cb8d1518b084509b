/** Hands a made file to the browser's downloads. */
export function downloadText(pieces: Iterable<string>, name: string, type: string): void {
  const url = URL.createObjectURL(new Blob([...pieces], { type }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  URL.revokeObjectURL(url);
}

/** @returns a title as a file name: letters, figures and hyphens of any script */
export function fileNameOf(title: string): string {
  const plain = title
    .normalize('NFC')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 80);
  return plain || 'move';
}
