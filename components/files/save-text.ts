/** Hands the browser a text as a file to save. */
export function saveText(name: string, text: string): void {
  // The mark at the beginning tells a spreadsheet that the letters are UTF-8.
  const url = URL.createObjectURL(new Blob(['\uFEFF', text], { type: 'text/csv' }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(url), 10_000);
}
