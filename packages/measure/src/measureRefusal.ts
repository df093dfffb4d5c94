import type { WavRefusal } from '@thudline/dsp';

export type MeasureRefusalCode =
  'unreadable' | 'wav-refused' | 'rates-differ' | 'no-such-channel' | 'same-channel';

/** What of a refusal crosses a thread. */
export interface MeasureRefusalFacts {
  readonly code: MeasureRefusalCode;
  /** One sentence for people, without the file's name. */
  readonly message: string;
  /** Which of the files it speaks of; null where it speaks of all. */
  readonly fileIndex: number | null;
  /** Why the file was refused, where the code is `wav-refused`. */
  readonly reason: WavRefusal | null;
}

/** Files that can't be measured together: the player's to mend, not a fault of the program. */
export class MeasureRefusal extends Error implements MeasureRefusalFacts {
  override readonly name = 'MeasureRefusal';
  readonly code: MeasureRefusalCode;
  readonly fileIndex: number | null;
  readonly reason: WavRefusal | null;

  constructor(facts: Omit<MeasureRefusalFacts, 'fileIndex' | 'reason'> & Partial<MeasureRefusalFacts>) {
    super(facts.message);
    this.code = facts.code;
    this.fileIndex = facts.fileIndex ?? null;
    this.reason = facts.reason ?? null;
  }

  /** @returns the refusal as plain data, since an error loses its fields between threads */
  toFacts(): MeasureRefusalFacts {
    return { code: this.code, message: this.message, fileIndex: this.fileIndex, reason: this.reason };
  }
}
