/** Has the browser keep a text as a file. */
export function keepFile(name: string, text: string, type: string): void {
  const url = URL.createObjectURL(new Blob([text], { type: `${type};charset=utf-8` }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  // The browser has taken the bytes by the next turn.
  setTimeout(() => URL.revokeObjectURL(url), 0);
}
