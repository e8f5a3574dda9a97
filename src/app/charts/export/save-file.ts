/** Gives the reader a file. */
export function saveFile(content: Blob, name: string): void {
  const address = URL.createObjectURL(content);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // The download has taken the content by the next turn.
  setTimeout(() => {
    URL.revokeObjectURL(address);
  });
}
