/** Hands a text to the browser as a file to keep. The byte-order mark lets spreadsheets read it as UTF-8. */
export function saveTextFile(name: string, text: string): void {
  const address = URL.createObjectURL(new Blob(['\uFEFF', text], { type: 'text/csv;charset=utf-8' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  URL.revokeObjectURL(address);
}
