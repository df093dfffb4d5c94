const longestName = 120;

/** A client's file name without folders, control or direction-changing characters; never empty. */
export function safeFileName(name: string): string {
  const last = name.split(/[\\/]/).at(-1) ?? '';
  const printable = last.replace(/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}"<>|:*?]/gu, '').trim();
  if (printable === '' || /^\.+$/.test(printable)) return 'recording.wav';
  return printable.length > longestName ? shortened(printable) : printable;
}

function shortened(name: string): string {
  const extension = /\.\w{1,5}$/.exec(name)?.[0] ?? '';
  return name.slice(0, longestName - extension.length) + extension;
}
