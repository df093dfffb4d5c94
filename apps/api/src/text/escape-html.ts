const entities: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Text that stays text between tags and within quoted attributes. */
export const escapeHtml = (text: string): string =>
  text.replace(/[&<>"']/g, (letter) => entities[letter] ?? letter);
