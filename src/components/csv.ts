/** Tables as CSV (RFC 4180), and files to the reader's device. */

type CsvCell = string | number;

export function toCsv(rows: readonly (readonly CsvCell[])[]): string {
  return `${rows.map((row) => row.map(cell).join(',')).join('\r\n')}\r\n`;
}

function cell(value: CsvCell): string {
  if (typeof value === 'number') return String(value);
  // A label must not pass for a spreadsheet's formula.
  const safe = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

export function saveFile(name: string, text: string, type: string): void {
  // The mark tells spreadsheets that the text is UTF-8.
  const url = URL.createObjectURL(new Blob(['\uFEFF', text], { type: `${type};charset=utf-8` }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  URL.revokeObjectURL(url);
}
