import FFT from 'fft.js';
import { transformKernelText } from './transformKernelText';
import { compiledKernel, kernelInstance } from './webAssembly';

/** A forward transform of complex numbers, real and imaginary parts one after the other. */
export interface ComplexTransform {
  /** To be filled before each transform, whose room it is as well: `size` numbers. */
  readonly input: Float64Array;
  /** @returns the unscaled spectrum of `input`; good until `input` is filled again */
  transform(): Float64Array;
}

/** @param size - a power of two, at least 2 */
export function createComplexTransform(size: number): ComplexTransform {
  return createKernelTransform(size) ?? createPlainTransform(size);
}

/** By fft.js; what the kernel is held to, and what does it where there is no kernel. */
export function createPlainTransform(size: number): ComplexTransform {
  const fft = new FFT(size);
  const input = new Float64Array(2 * size);
  const output = new Float64Array(2 * size);
  return {
    input,
    transform() {
      fft.transform(output, input);
      return output;
    },
  };
}

interface Stage {
  readonly groups: number;
  readonly stride: number;
  readonly turns: number;
}

const bytesOfOne = 16;
const turnsOfGroup = 3;
let compiled: object | null | undefined;

/** @returns null where there is no kernel to be had */
export function createKernelTransform(size: number): ComplexTransform | null {
  compiled = compiled === undefined ? compiledKernel(transformKernelText) : compiled;
  if (!compiled) return null;
  const rooms = [0, size * bytesOfOne];
  const stages: Stage[] = [];
  let turns = 2 * size * bytesOfOne;
  let [left, stride] = [size, 1];
  for (; left >= 4; left /= 4, stride *= 4) {
    stages.push({ groups: left / 4, stride, turns });
    turns += (left / 4) * turnsOfGroup * bytesOfOne;
  }
  const instance = kernelInstance(compiled, turns);
  if (!instance) return null;
  const { functions, memory } = instance;
  const allTurns = new Float64Array(memory, 2 * size * bytesOfOne);
  allTurns.set(turnsFor(size, stages));
  const views = rooms.map((at) => new Float64Array(memory, at, 2 * size));
  return {
    input: views[0],
    transform() {
      let from = 0;
      for (const { groups, stride: step, turns: at } of stages) {
        functions['by_four'](rooms[from], rooms[1 - from], at, groups, step);
        from = 1 - from;
      }
      if (left === 2) {
        functions['by_two'](rooms[from], rooms[1 - from], stride);
        from = 1 - from;
      }
      return views[from];
    },
  };
}

/** They depend on nothing but the size, and take as long to make as some transforms. */
const keptTurns = new Map<number, Float64Array>();
const largestKept = 2 ** 14;

/** @returns the turns of every stage, one stage after the other */
function turnsFor(size: number, stages: readonly Stage[]): Float64Array {
  const known = keptTurns.get(size);
  if (known) return known;
  const count = stages.reduce((sum, { groups }) => sum + groups, 0);
  const turns = new Float64Array(2 * turnsOfGroup * count);
  let at = 0;
  for (const { groups } of stages) {
    for (let group = 0; group < groups; group += 1) {
      for (let times = 1; times <= turnsOfGroup; times += 1, at += 2) {
        const turn = (-2 * Math.PI * group * times) / (4 * groups);
        turns[at] = Math.cos(turn);
        turns[at + 1] = Math.sin(turn);
      }
    }
  }
  if (size <= largestKept) keptTurns.set(size, turns);
  return turns;
}
