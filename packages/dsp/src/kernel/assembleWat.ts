import { alignments, opcodes, valueTypes, vectorOpcodes } from './opcodes';

/** A word, or a list in brackets. */
type Node = string | readonly Node[];

/**
 * Assembles a small part of WebAssembly's text format, so that a kernel's source is what is read here and nothing is
 * compiled beforehand.
 *
 * One module of functions that give nothing back, each exported by its name, over one memory that is imported as
 * `own.memory`. Instructions are written as lists, operands first: `(i32.add (local.get $i) (i32.const 4))`.
 *
 * @param text - `(func $name (param $p i32) … (local $l v128) … instructions)`, any number of them
 * @returns the module's bytes
 * @throws {Error} what this part doesn't know: a mistake in a kernel
 * @see WebAssembly core specification 2.0, sections 5 (bytes) and 6 (text)
 * @example
 * assembleWat('(func $nothing (param $p i32))').length // 63
 */
export function assembleWat(text: string): Uint8Array<ArrayBuffer> {
  const functions = parsed(text).map(assembledFunction);
  const types = functions.map(({ params }) => [0x60, ...vector(params), 0]);
  return Uint8Array.from([
    ...[0x00, 0x61, 0x73, 0x6d, 1, 0, 0, 0],
    ...section(1, types),
    ...section(2, [[...name('own'), ...name('memory'), 0x02, 0x00, 1]]),
    ...section(
      3,
      types.map((_unused, index) => unsigned(index)),
    ),
    ...section(
      7,
      functions.map((each, index) => [...name(each.name), 0x00, ...unsigned(index)]),
    ),
    ...section(
      10,
      functions.map(({ body }) => [...unsigned(body.length), ...body]),
    ),
  ]);
}

function parsed(text: string): readonly Node[] {
  const words = text.replace(/;;.*/g, '').match(/[()]|[^\s()]+/g) ?? [];
  const open: Node[][] = [[]];
  for (const word of words) {
    if (word === '(') open.push([]);
    else if (word !== ')') open.at(-1)?.push(word);
    else {
      const list = open.pop() ?? [];
      if (open.length === 0) throw new Error('A bracket is closed that was never opened.');
      open.at(-1)?.push(list);
    }
  }
  if (open.length > 1) throw new Error('A bracket is never closed.');
  return open[0];
}

function assembledFunction(node: Node): { name: string; params: number[]; body: number[] } {
  if (typeof node === 'string' || node[0] !== 'func') throw new Error('A module is made of functions.');
  const [, functionName, ...parts] = node;
  const declared = (kind: string): [string, number][] =>
    parts.filter((part) => part[0] === kind).map((part) => [word(part[1]), known(valueTypes, word(part[2]))]);
  const [params, locals] = [declared('param'), declared('local')];
  const places = new Map([...params, ...locals].map(([local], index) => [local, index]));
  const instructions = parts.filter((part) => part[0] !== 'param' && part[0] !== 'local');
  const code = instructions.flatMap((instruction) => assembled(instruction, places, []));
  return {
    name: word(functionName).slice(1),
    params: params.map(([, type]) => type),
    body: [...vector(locals.map(([, type]) => [1, type])), ...code, 0x0b],
  };
}

/** @param labels - of the blocks and loops around it, the innermost last */
function assembled(node: Node, places: ReadonlyMap<string, number>, labels: readonly string[]): number[] {
  if (typeof node === 'string') throw new Error(`An instruction stands in brackets, not "${node}".`);
  const [head, ...rest] = node;
  const operation = word(head);
  if (operation === 'block' || operation === 'loop') {
    const inside = [...labels, word(rest[0])];
    return [
      opcodes[operation],
      0x40,
      ...rest.slice(1).flatMap((each) => assembled(each, places, inside)),
      0x0b,
    ];
  }
  const operands = rest.filter((each) => typeof each !== 'string');
  const immediates = rest.filter((each) => typeof each === 'string');
  return [
    ...operands.flatMap((operand) => assembled(operand, places, labels)),
    ...(operation in vectorOpcodes
      ? [0xfd, ...unsigned(vectorOpcodes[operation])]
      : [known(opcodes, operation)]),
    ...assembledImmediates(operation, immediates, { places, labels }),
  ];
}

function assembledImmediates(
  operation: string,
  immediates: readonly string[],
  { places, labels }: { places: ReadonlyMap<string, number>; labels: readonly string[] },
): number[] {
  const [first = ''] = immediates;
  if (operation.startsWith('local.')) {
    const place = places.get(first);
    if (place === undefined) throw new Error(`There is no local "${first}".`);
    return unsigned(place);
  }
  if (operation.startsWith('br')) {
    const label = labels.lastIndexOf(first);
    if (label < 0) throw new Error(`There is no label "${first}".`);
    return unsigned(labels.length - 1 - label);
  }
  if (operation in alignments) {
    const offset = /^offset=(\d+)$/.exec(first)?.[1] ?? '0';
    return [alignments[operation], ...unsigned(Number(offset))];
  }
  if (operation === 'f64.const') return [...new Uint8Array(Float64Array.of(Number(first)).buffer)];
  if (operation === 'i32.const') return signed(Number(first));
  return immediates.map(Number);
}

function word(node: Node | undefined): string {
  if (typeof node !== 'string') throw new Error('A name or a word is missing.');
  return node;
}

function known(table: Readonly<Record<string, number>>, key: string): number {
  const value = table[key];
  if (value === undefined) throw new Error(`"${key}" is not known here.`);
  return value;
}

function section(id: number, entries: readonly (readonly number[])[]): number[] {
  const content = vector(entries);
  return [id, ...unsigned(content.length), ...content];
}

function vector(entries: readonly (number | readonly number[])[]): number[] {
  return [...unsigned(entries.length), ...entries.flat()];
}

function name(text: string): number[] {
  return vector([...text].map((letter) => letter.charCodeAt(0)));
}

/** LEB128. */
function unsigned(value: number): number[] {
  return value < 0x80 ? [value] : [(value & 0x7f) | 0x80, ...unsigned(value >>> 7)];
}

function signed(value: number): number[] {
  const isLast = value >= -0x40 && value < 0x40;
  return isLast ? [value & 0x7f] : [(value & 0x7f) | 0x80, ...signed(value >> 7)];
}
