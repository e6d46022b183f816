/** Hands a text to the browser as a file to keep. */
export function saveFile(name: string, text: string, type: string): void {
  const address = URL.createObjectURL(new Blob([text], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // Some phones begin to read only after the press has ended.
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}
