import type { TakeFileResponse } from '@thudline/contracts';

const wholeNumber = new Intl.NumberFormat('en');

/** What a recorder wrote into a file, in one line; dates and times as its own clock had them. */
export function broadcastWords(broadcast: NonNullable<TakeFileResponse['broadcast']>): string {
  const { description, originator, date, time, timeReferenceSamples } = broadcast;
  const samples = timeReferenceSamples ?? 0;
  const parts = [
    description && `“${description}”`,
    originator && `by ${originator}`,
    date && `recorded ${time ? `${date} at ${time}` : date} by its clock`,
    // Zero is what a recorder without such a clock writes.
    samples > 0 && `begins ${wholeNumber.format(samples)} samples after midnight`,
  ].filter(Boolean);
  return `In the file: ${parts.join(', ')}.`;
}
