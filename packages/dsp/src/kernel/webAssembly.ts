import { assembleWat } from './assembleWat';

/** The little of WebAssembly that is used: neither Node's types nor the language's have it. */
interface WebAssemblyDoor {
  readonly Memory: new (options: { initial: number }) => { readonly buffer: ArrayBuffer };
  readonly Module: new (bytes: Uint8Array<ArrayBuffer>) => object;
  readonly Instance: new (
    module: object,
    imports: { own: { memory: object } },
  ) => { readonly exports: Readonly<Record<string, (...operands: number[]) => void>> };
}

export interface KernelInstance {
  readonly functions: Readonly<Record<string, (...operands: number[]) => void>>;
  readonly memory: ArrayBuffer;
}

const pageBytes = 65_536;

/** @returns the module; null where there is no WebAssembly with vectors, or a page's policy forbids it */
export function compiledKernel(text: string): object | null {
  try {
    return new (door().Module)(assembleWat(text));
  } catch {
    return null;
  }
}

/** A kernel with a memory of its own. @returns null where no memory is to be had */
export function kernelInstance(module: object, memoryBytes: number): KernelInstance | null {
  try {
    const memory = new (door().Memory)({ initial: Math.ceil(memoryBytes / pageBytes) });
    const { exports } = new (door().Instance)(module, { own: { memory } });
    return { functions: exports, memory: memory.buffer };
  } catch {
    return null;
  }
}

function door(): WebAssemblyDoor {
  return (globalThis as unknown as { WebAssembly: WebAssemblyDoor }).WebAssembly;
}
