/**
 * Goes through spans of samples, two numbers of 64 bits or four samples at a time.
 *
 * - `$samples`: the first sample, 32-bit floats, one after the other.
 * - `$ends`: for each span the number of samples up to its end, counted from `$samples`; 32-bit integers.
 * - `$count`: of the spans.
 */
export const spanKernelText = `
;; Two filters of two sections each, side by side in the lanes of a vector, and the energy of what comes out of them:
;; for each span the sum of squares of the one and of the other.
;; $filter: b1/b0 - a1, b2/b0 - a2, a1 and a2 of the first sections, the same of the second, then their four states;
;; two numbers each. See bandEnergy.ts, whose loop this is.
(func $band_energies (param $samples i32) (param $ends i32) (param $count i32) (param $filter i32) (param $out i32)
  (local $at i32) (local $end i32)
  (local $p1 v128) (local $p2 v128) (local $pa1 v128) (local $pa2 v128)
  (local $q1 v128) (local $q2 v128) (local $qa1 v128) (local $qa2 v128)
  (local $u1 v128) (local $u2 v128) (local $v1 v128) (local $v2 v128)
  (local $x v128) (local $y v128) (local $z v128) (local $energy v128) (local $kept v128) (local $smallest v128)
  (local.set $p1 (v128.load (local.get $filter)))
  (local.set $p2 (v128.load offset=16 (local.get $filter)))
  (local.set $pa1 (v128.load offset=32 (local.get $filter)))
  (local.set $pa2 (v128.load offset=48 (local.get $filter)))
  (local.set $q1 (v128.load offset=64 (local.get $filter)))
  (local.set $q2 (v128.load offset=80 (local.get $filter)))
  (local.set $qa1 (v128.load offset=96 (local.get $filter)))
  (local.set $qa2 (v128.load offset=112 (local.get $filter)))
  (local.set $u1 (v128.load offset=128 (local.get $filter)))
  (local.set $u2 (v128.load offset=144 (local.get $filter)))
  (local.set $v1 (v128.load offset=160 (local.get $filter)))
  (local.set $v2 (v128.load offset=176 (local.get $filter)))
  (local.set $smallest (f64x2.splat (f64.const 1e-30)))
  (local.set $at (local.get $samples))
  (block $done
    (loop $spans
      (br_if $done (i32.lt_u (local.get $count) (i32.const 1)))
      (local.set $end
        (i32.add (local.get $samples) (i32.shl (i32.load (local.get $ends)) (i32.const 2))))
      (local.set $energy (f64x2.splat (f64.const 0)))
      (block $filtered
        (loop $next
          (br_if $filtered (i32.ge_u (local.get $at) (local.get $end)))
          (local.set $x (f64x2.splat (f64.promote_f32 (f32.load (local.get $at)))))
          (local.set $y (f64x2.add (local.get $x) (local.get $u1)))
          (local.set $kept (local.get $u1))
          (local.set $u1
            (f64x2.sub
              (f64x2.add (f64x2.mul (local.get $p1) (local.get $x)) (local.get $u2))
              (f64x2.mul (local.get $pa1) (local.get $u1))))
          (local.set $u2
            (f64x2.sub
              (f64x2.mul (local.get $p2) (local.get $x))
              (f64x2.mul (local.get $pa2) (local.get $kept))))
          (local.set $z (f64x2.add (local.get $y) (local.get $v1)))
          (local.set $kept (local.get $v1))
          (local.set $v1
            (f64x2.sub
              (f64x2.add (f64x2.mul (local.get $q1) (local.get $y)) (local.get $v2))
              (f64x2.mul (local.get $qa1) (local.get $v1))))
          (local.set $v2
            (f64x2.sub
              (f64x2.mul (local.get $q2) (local.get $y))
              (f64x2.mul (local.get $qa2) (local.get $kept))))
          (local.set $energy
            (f64x2.add (local.get $energy) (f64x2.mul (local.get $z) (local.get $z))))
          (local.set $at (i32.add (local.get $at) (i32.const 4)))
          (br $next)))
      (v128.store (local.get $out) (local.get $energy))
      ;; What decays to nothing becomes nothing before it becomes slow.
      (local.set $u1 (v128.and (local.get $u1) (f64x2.ge (f64x2.abs (local.get $u1)) (local.get $smallest))))
      (local.set $u2 (v128.and (local.get $u2) (f64x2.ge (f64x2.abs (local.get $u2)) (local.get $smallest))))
      (local.set $v1 (v128.and (local.get $v1) (f64x2.ge (f64x2.abs (local.get $v1)) (local.get $smallest))))
      (local.set $v2 (v128.and (local.get $v2) (f64x2.ge (f64x2.abs (local.get $v2)) (local.get $smallest))))
      (local.set $out (i32.add (local.get $out) (i32.const 16)))
      (local.set $ends (i32.add (local.get $ends) (i32.const 4)))
      (local.set $count (i32.sub (local.get $count) (i32.const 1)))
      (br $spans)))
  (v128.store offset=128 (local.get $filter) (local.get $u1))
  (v128.store offset=144 (local.get $filter) (local.get $u2))
  (v128.store offset=160 (local.get $filter) (local.get $v1))
  (v128.store offset=176 (local.get $filter) (local.get $v2)))

;; For each span its lowest and highest sample, its sum and its energy: four numbers of 64 bits.
(func $extremes (param $samples i32) (param $ends i32) (param $count i32) (param $out i32)
  (local $at i32) (local $end i32) (local $whole i32)
  (local $x v128) (local $low v128) (local $high v128) (local $wide v128) (local $sum v128) (local $energy v128)
  (local $one f32) (local $least f32) (local $most f32) (local $total f64) (local $power f64)
  (local.set $at (local.get $samples))
  (block $done
    (loop $spans
      (br_if $done (i32.lt_u (local.get $count) (i32.const 1)))
      (local.set $end
        (i32.add (local.get $samples) (i32.shl (i32.load (local.get $ends)) (i32.const 2))))
      ;; The end of the last whole four samples.
      (local.set $whole
        (i32.add (local.get $at) (i32.and (i32.sub (local.get $end) (local.get $at)) (i32.const -16))))
      (local.set $low (f32x4.splat (f32.load (local.get $at))))
      (local.set $high (local.get $low))
      (local.set $sum (f64x2.splat (f64.const 0)))
      (local.set $energy (local.get $sum))
      (block $fours
        (loop $next
          (br_if $fours (i32.ge_u (local.get $at) (local.get $whole)))
          (local.set $x (v128.load (local.get $at)))
          (local.set $low (f32x4.min (local.get $low) (local.get $x)))
          (local.set $high (f32x4.max (local.get $high) (local.get $x)))
          (local.set $wide (f64x2.promote_low_f32x4 (local.get $x)))
          (local.set $sum (f64x2.add (local.get $sum) (local.get $wide)))
          (local.set $energy
            (f64x2.add (local.get $energy) (f64x2.mul (local.get $wide) (local.get $wide))))
          (local.set $wide
            (f64x2.promote_low_f32x4
              (i8x16.shuffle 8 9 10 11 12 13 14 15 8 9 10 11 12 13 14 15 (local.get $x) (local.get $x))))
          (local.set $sum (f64x2.add (local.get $sum) (local.get $wide)))
          (local.set $energy
            (f64x2.add (local.get $energy) (f64x2.mul (local.get $wide) (local.get $wide))))
          (local.set $at (i32.add (local.get $at) (i32.const 16)))
          (br $next)))
      (local.set $least
        (f32.min
          (f32.min (f32x4.extract_lane 0 (local.get $low)) (f32x4.extract_lane 1 (local.get $low)))
          (f32.min (f32x4.extract_lane 2 (local.get $low)) (f32x4.extract_lane 3 (local.get $low)))))
      (local.set $most
        (f32.max
          (f32.max (f32x4.extract_lane 0 (local.get $high)) (f32x4.extract_lane 1 (local.get $high)))
          (f32.max (f32x4.extract_lane 2 (local.get $high)) (f32x4.extract_lane 3 (local.get $high)))))
      (local.set $total
        (f64.add (f64x2.extract_lane 0 (local.get $sum)) (f64x2.extract_lane 1 (local.get $sum))))
      (local.set $power
        (f64.add (f64x2.extract_lane 0 (local.get $energy)) (f64x2.extract_lane 1 (local.get $energy))))
      (block $ones
        (loop $next
          (br_if $ones (i32.ge_u (local.get $at) (local.get $end)))
          (local.set $one (f32.load (local.get $at)))
          (local.set $least (f32.min (local.get $least) (local.get $one)))
          (local.set $most (f32.max (local.get $most) (local.get $one)))
          (local.set $total (f64.add (local.get $total) (f64.promote_f32 (local.get $one))))
          (local.set $power
            (f64.add
              (local.get $power)
              (f64.mul (f64.promote_f32 (local.get $one)) (f64.promote_f32 (local.get $one)))))
          (local.set $at (i32.add (local.get $at) (i32.const 4)))
          (br $next)))
      (f64.store (local.get $out) (f64.promote_f32 (local.get $least)))
      (f64.store offset=8 (local.get $out) (f64.promote_f32 (local.get $most)))
      (f64.store offset=16 (local.get $out) (local.get $total))
      (f64.store offset=24 (local.get $out) (local.get $power))
      (local.set $out (i32.add (local.get $out) (i32.const 32)))
      (local.set $ends (i32.add (local.get $ends) (i32.const 4)))
      (local.set $count (i32.sub (local.get $count) (i32.const 1)))
      (br $spans))))
`;
