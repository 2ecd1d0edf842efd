/** Files to the reader's device. */

export function saveFile(name: string, text: string, type: string): void {
  // The mark tells spreadsheets that the text is UTF-8.
  const url = URL.createObjectURL(new Blob(['\uFEFF', text], { type: `${type};charset=utf-8` }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  URL.revokeObjectURL(url);
}
