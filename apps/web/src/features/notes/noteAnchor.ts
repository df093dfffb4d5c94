/** The id of a note on the page; mails lead to it. */
export const noteAnchor = (noteId: string) => `note-${noteId}`;
