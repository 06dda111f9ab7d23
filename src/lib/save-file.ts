/** Offers text made on this page as a file to save. */
export function saveFile(name: string, text: string, type: string): void {
  const address = URL.createObjectURL(new Blob([text], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}

/** A name that is safe in any file system: its letters, digits and dashes. */
export const safeFileName = (name: string, ending: string): string =>
  `${name.replace(/[^A-Za-z0-9-]+/g, '-').replace(/^-+|-+$/g, '') || 'frame'}${ending}`;
