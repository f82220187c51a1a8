/** Hands bytes to the browser as a download. */
export function saveBlob(blob: Blob, fileName: string): void {
  const address = URL.createObjectURL(blob);
  const anchor = document.createElement('a');
  anchor.href = address;
  anchor.download = fileName;
  anchor.click();
  URL.revokeObjectURL(address);
}

/** A CSV text as a download, marked so that spreadsheets read it as UTF-8. */
export function saveCsv(text: string, fileName: string): void {
  saveBlob(new Blob(['\uFEFF', text], { type: 'text/csv;charset=utf-8' }), fileName);
}
