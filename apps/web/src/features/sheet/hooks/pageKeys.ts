/** Fields, lists and whatever acts on its own keys keep them. */
const keepsItsKeys =
  'input, textarea, select, summary, [contenteditable], [role="group"] [tabindex], [role="slider"]';

/** Whether a single key is the page's: not in a field, not behind a dialog, not one held down. */
export function isForPage(event: KeyboardEvent): boolean {
  if (event.ctrlKey || event.metaKey || event.altKey || event.defaultPrevented || event.repeat) return false;
  if (document.querySelector('dialog[open]')) return false;
  if (!(event.target instanceof Element)) return true;
  if (event.target.closest(keepsItsKeys)) return false;
  // A choice just clicked keeps the focus: digits and arrows still act there, Space presses the button itself.
  return event.key !== ' ' || event.target.closest('button, a') === null;
}
