export const noteBoxId = 'write-note';

/** Puts the cursor into the box at the end of the sheet. */
export function focusNoteBox(): void {
  const box = document.getElementById(noteBoxId);
  box?.querySelector('textarea')?.focus();
}
