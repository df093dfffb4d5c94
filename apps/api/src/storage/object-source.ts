import { ByteSource } from '@thudline/dsp';
import { ObjectStoreService } from './object-store.service';

/** An object as a `ByteSource`: ranged reads, the last stretch kept, since two channels of one file read it twice. */
export class ObjectSource implements ByteSource {
  private keptStart = 0;
  private kept: Uint8Array = new Uint8Array(0);

  constructor(
    private readonly store: ObjectStoreService,
    private readonly key: string,
    readonly sizeBytes: number,
  ) {}

  async read(start: number, end: number): Promise<Uint8Array> {
    const stop = Math.min(end, this.sizeBytes);
    if (stop <= start) return new Uint8Array(0);
    if (start < this.keptStart || stop > this.keptStart + this.kept.length) {
      this.kept = await this.store.read(this.key, start, stop);
      this.keptStart = start;
    }
    return this.kept.slice(start - this.keptStart, stop - this.keptStart);
  }
}
