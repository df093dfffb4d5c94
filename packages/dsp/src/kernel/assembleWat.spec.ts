import { assembleWat } from './assembleWat';
import { kernelInstance, compiledKernel } from './webAssembly';

const run = (text: string, ...operands: number[]): Float64Array => {
  const module = compiledKernel(text);
  const instance = module && kernelInstance(module, 8);
  if (!instance) throw new Error('It does not compile.');
  instance.functions['it'](...operands);
  return new Float64Array(instance.memory);
};

describe('the assembler of kernels', () => {
  it('puts operands before their instruction', () => {
    const text = `
      ;; (3 + 4) · 5
      (func $it (param $at i32)
        (f64.store (local.get $at) (f64.mul (f64.add (f64.const 3) (f64.const 4)) (f64.const 5))))`;
    expect(run(text, 16)[2]).toBe(35);
  });

  it('finds labels from the inside out', () => {
    // Adds 0.5 as often as it is told, in a loop that is left through the block around it.
    const text = `
      (func $it (param $times i32) (local $sum f64)
        (block $done
          (loop $again
            (br_if $done (i32.lt_u (local.get $times) (i32.const 1)))
            (local.set $sum (f64.add (local.get $sum) (f64.const 0.5)))
            (local.set $times (i32.sub (local.get $times) (i32.const 1)))
            (br $again)))
        (f64.store (i32.const 0) (local.get $sum)))`;
    expect(run(text, 300)[0]).toBe(150);
  });

  it('writes numbers of more than seven bits, and negative ones', () => {
    const text = (at: number) => `
      (func $it
        (f64.store offset=${at} (i32.and (i32.const 1000) (i32.const -16)) (f64.const -1e-3)))`;
    expect(run(text(8))[(992 + 8) / 8]).toBe(-0.001);
    expect(run(text(8192))[(992 + 8192) / 8]).toBe(-0.001);
  });

  it.each([
    ['a word it does not know', '(func $it (f64.sqrt (f64.const 1)))', '"f64.sqrt" is not known here.'],
    ['a local that is not there', '(func $it (local.get $gone))', 'There is no local "$gone".'],
    ['a label that is not there', '(func $it (br $gone))', 'There is no label "$gone".'],
    ['an open bracket', '(func $it (i32.const 1)', 'A bracket is never closed.'],
    ['a closed one', '(func $it))', 'A bracket is closed that was never opened.'],
    ['a word outside of brackets', '(func $it nothing)', 'An instruction stands in brackets, not "nothing".'],
  ])('refuses %s', (_what, text, message) => {
    expect(() => assembleWat(text)).toThrow(message);
  });
});
