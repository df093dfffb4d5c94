import { broadcastChunk } from './broadcastChunk';
import { chunk, fmt, pcmGuid, riff } from './handMadeWav';

/** @returns a whole number from 0 up to, without, the one given */
export type Random = (below: number) => number;

/** A linear congruential generator (Numerical Recipes' constants), so that a failure can be run again. */
export function seededRandom(seed: number): Random {
  let state = seed >>> 0;
  return (below) => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return Math.floor((state / 2 ** 32) * below);
  };
}

interface Original {
  readonly container: string;
  readonly chunks: readonly Uint8Array[];
}

const sound = chunk('data', new Uint8Array(600).fill(77));
const broadcast = broadcastChunk({ description: 'Take 4', originator: 'Recorder', date: '2026-11-30' });

function ds64(dataBytes: bigint, bodyBytes = 28): Uint8Array {
  const view = new DataView(new ArrayBuffer(bodyBytes));
  if (bodyBytes >= 16) view.setBigUint64(8, dataBytes, true);
  return chunk('ds64', new Uint8Array(view.buffer));
}
const longSound = chunk('data', new Uint8Array(600).fill(77), { declaredBytes: 0xffffffff });

const originals: readonly Original[] = [
  { container: 'RIFF', chunks: [fmt({ channels: 2 }), sound] },
  { container: 'RIFF', chunks: [chunk('LIST', new Uint8Array(9)), fmt({ bits: 24 }), sound, broadcast] },
  {
    container: 'RIFF',
    chunks: [broadcast, fmt({ bits: 32, extensible: { validBits: 24, guid: pcmGuid } }), sound],
  },
  { container: 'RF64', chunks: [ds64(600n), fmt({ bits: 64, tag: 3 }), longSound] },
  { container: 'BW64', chunks: [ds64(600n), fmt({ channels: 3, bits: 8 }), longSound, broadcast] },
];

const nastyBytes = [0, 1, 0x7f, 0x80, 0xff];
const nastySizes = [0, 1, 2, 7, 15, 16, 17, 39, 599, 601, 0x7fffffff, 0x80000000, 0xfffffffe, 0xffffffff];
const nastyLengths = [0n, 1n, 599n, 601n, 2n ** 32n, 2n ** 53n, 2n ** 63n, 2n ** 64n - 1n];

type Mutation = (chunks: Uint8Array[], random: Random) => Uint8Array[];

const mutations: readonly Mutation[] = [
  // A size that claims anything.
  (chunks, random) => {
    const claimed = random(2) ? nastySizes[random(nastySizes.length)] : random(2 ** 32);
    const changed = chunks[random(chunks.length)];
    new DataView(changed.buffer, changed.byteOffset).setUint32(4, claimed, true);
    return chunks;
  },
  // Another order; one missing; one twice.
  (chunks, random) =>
    chunks
      .map((each) => ({ each, at: random(1000) }))
      .sort((a, b) => a.at - b.at)
      .map(({ each }) => each),
  (chunks, random) => chunks.filter((_, i, { length }) => i !== random(length)),
  (chunks, random) => [...chunks, chunks[random(chunks.length)].slice()],
  // A ds64 that says anything, too short or in the wrong place.
  (chunks, random) => {
    const bodyBytes = [0, 8, 15, 16, 28][random(5)];
    chunks.splice(random(chunks.length + 1), 0, ds64(nastyLengths[random(nastyLengths.length)], bodyBytes));
    return chunks;
  },
  // A bext of any bytes and any length.
  (chunks, random) => {
    const body = Uint8Array.from({ length: random(700) }, () => random(256));
    chunks.splice(random(chunks.length + 1), 0, chunk('bext', body, { pad: random(2) === 0 }));
    return chunks;
  },
  // An odd chunk with and without its pad byte.
  (chunks, random) => {
    const odd = chunk(random(2) ? 'LIST' : 'zzzz', new Uint8Array(2 * random(20) + 1).fill(65), {
      pad: random(2) === 0,
    });
    chunks.splice(random(chunks.length + 1), 0, odd);
    return chunks;
  },
  // Many small chunks, as a damaged file of a few megabytes may seem to hold.
  (chunks, random) => [
    ...Array.from({ length: random(300) }, () => chunk('    ', new Uint8Array(0))),
    ...chunks,
  ],
  // Any bytes within the first of each chunk, where its header and its fields lie.
  (chunks, random) => {
    for (let i = random(6); i >= 0; i--) {
      const changed = chunks[random(chunks.length)];
      changed[random(Math.min(60, changed.length))] = random(2)
        ? nastyBytes[random(nastyBytes.length)]
        : random(256);
    }
    return chunks;
  },
];

/** @returns a damaged WAV file: one to three mutations of its chunks, now and then cut off or with a damaged head */
export function mutatedWav(random: Random): Uint8Array {
  const { container, chunks } = originals[random(originals.length)];
  let changed: Uint8Array[] = chunks.map((each) => each.slice());
  for (let i = random(3); i >= 0 && changed.length > 0; i--) {
    changed = mutations[random(mutations.length)](changed, random);
  }
  const bytes = riff(changed, container);
  if (random(8) === 0) bytes[random(12)] = random(256);
  return random(4) ? bytes : bytes.subarray(0, random(bytes.length));
}
