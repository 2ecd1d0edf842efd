/** Files to the reader's device. */

export function saveFile(name: string, text: string, type: string): void {
  // The mark tells spreadsheets that the text is UTF-8.
  saveBlob(name, new Blob(['\uFEFF', text], { type: `${type};charset=utf-8` }));
}

export function saveBlob(name: string, blob: Blob): void {
  const url = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  URL.revokeObjectURL(url);
}
