/** The instructions that the kernels use, as the WebAssembly core specification 2.0 numbers them (section 5.4). */
export const opcodes: Readonly<Record<string, number>> = {
  block: 0x02,
  loop: 0x03,
  br: 0x0c,
  br_if: 0x0d,
  'local.get': 0x20,
  'local.set': 0x21,
  'local.tee': 0x22,
  'i32.load': 0x28,
  'f32.load': 0x2a,
  'f64.store': 0x39,
  'i32.const': 0x41,
  'f64.const': 0x44,
  'i32.lt_u': 0x49,
  'i32.ge_u': 0x4f,
  'i32.add': 0x6a,
  'i32.sub': 0x6b,
  'i32.mul': 0x6c,
  'i32.and': 0x71,
  'i32.shl': 0x74,
  'f32.min': 0x96,
  'f32.max': 0x97,
  'f64.add': 0xa0,
  'f64.mul': 0xa2,
  'f64.promote_f32': 0xbb,
};

/** The same of vectors of 128 bits, behind the byte 0xfd. */
export const vectorOpcodes: Readonly<Record<string, number>> = {
  'v128.load': 0x00,
  'v128.store': 0x0b,
  'f64x2.splat': 0x14,
  'f32x4.splat': 0x13,
  'f32x4.extract_lane': 0x1f,
  'f64x2.extract_lane': 0x21,
  'i8x16.shuffle': 0x0d,
  'v128.and': 0x4e,
  'f64x2.ge': 0x4c,
  'f64x2.promote_low_f32x4': 0x5f,
  'f32x4.min': 0xe8,
  'f32x4.max': 0xe9,
  'f64x2.abs': 0xec,
  'f64x2.add': 0xf0,
  'f64x2.sub': 0xf1,
  'f64x2.mul': 0xf2,
};

export const valueTypes: Readonly<Record<string, number>> = { i32: 0x7f, f32: 0x7d, f64: 0x7c, v128: 0x7b };

/** What an address in memory is told to be a multiple of, as a power of two; none of it changes a result. */
export const alignments: Readonly<Record<string, number>> = {
  'i32.load': 2,
  'f32.load': 2,
  'f64.store': 3,
  'v128.load': 3,
  'v128.store': 3,
};
