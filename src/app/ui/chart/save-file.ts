/** Hands a file to the browser's downloads. */
export function saveFile(name: string, content: Blob): void {
  const address = URL.createObjectURL(content);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // The download has begun once the click returns; freeing at once breaks it in some browsers.
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
