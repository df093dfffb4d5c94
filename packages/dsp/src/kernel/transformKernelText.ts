/**
 * Stages of Stockham's Fourier transform of complex numbers, each a vector of two 64-bit numbers: a stage reads one room and
 * writes the other, and the outcome is in order without anything being swapped.
 *
 * @see C. Van Loan, "Computational Frameworks for the Fast Fourier Transform" (1992), section 1.7
 */
export const transformKernelText = `
;; Four at a time: for each of $groups turns and each of $stride sequences takes the numbers $groups * $stride apart.
;; $turns: for each group w, w squared and w cubed, w = exp(-2 pi i p / (4 * $groups)).
(func $by_four (param $from i32) (param $to i32) (param $turns i32) (param $groups i32) (param $stride i32)
  (local $apart i32) (local $step i32) (local $end i32)
  (local $w1 v128) (local $w2 v128) (local $w3 v128) (local $v1 v128) (local $v2 v128) (local $v3 v128)
  (local $a v128) (local $b v128) (local $c v128) (local $d v128)
  (local $even v128) (local $odd v128) (local $both v128) (local $turned v128) (local $sign v128)
  ;; -1 and 1: what turns a number by a right angle once its halves have changed places.
  (local.set $sign
    (i8x16.shuffle 0 1 2 3 4 5 6 7 24 25 26 27 28 29 30 31
      (f64x2.splat (f64.const -1)) (f64x2.splat (f64.const 1))))
  (local.set $step (i32.shl (local.get $stride) (i32.const 4)))
  (local.set $apart (i32.mul (local.get $groups) (local.get $step)))
  (block $done
    (loop $group
      (br_if $done (i32.lt_u (local.get $groups) (i32.const 1)))
      ;; Real parts in both lanes, imaginary ones with the sign that a product needs.
      (local.set $w1 (v128.load (local.get $turns)))
      (local.set $w2 (v128.load offset=16 (local.get $turns)))
      (local.set $w3 (v128.load offset=32 (local.get $turns)))
      (local.set $v1 (f64x2.mul (local.get $sign)
        (i8x16.shuffle 8 9 10 11 12 13 14 15 8 9 10 11 12 13 14 15 (local.get $w1) (local.get $w1))))
      (local.set $v2 (f64x2.mul (local.get $sign)
        (i8x16.shuffle 8 9 10 11 12 13 14 15 8 9 10 11 12 13 14 15 (local.get $w2) (local.get $w2))))
      (local.set $v3 (f64x2.mul (local.get $sign)
        (i8x16.shuffle 8 9 10 11 12 13 14 15 8 9 10 11 12 13 14 15 (local.get $w3) (local.get $w3))))
      (local.set $w1 (i8x16.shuffle 0 1 2 3 4 5 6 7 0 1 2 3 4 5 6 7 (local.get $w1) (local.get $w1)))
      (local.set $w2 (i8x16.shuffle 0 1 2 3 4 5 6 7 0 1 2 3 4 5 6 7 (local.get $w2) (local.get $w2)))
      (local.set $w3 (i8x16.shuffle 0 1 2 3 4 5 6 7 0 1 2 3 4 5 6 7 (local.get $w3) (local.get $w3)))
      (local.set $end (i32.add (local.get $from) (local.get $step)))
      (block $over
        (loop $sequence
          (br_if $over (i32.ge_u (local.get $from) (local.get $end)))
          (local.set $a (v128.load (local.get $from)))
          (local.set $b (v128.load (i32.add (local.get $from) (local.get $apart))))
          (local.set $c (v128.load (i32.add (local.get $from) (i32.shl (local.get $apart) (i32.const 1)))))
          (local.set $d
            (v128.load
              (i32.add (i32.add (local.get $from) (local.get $apart)) (i32.shl (local.get $apart) (i32.const 1)))))
          (local.set $even (f64x2.add (local.get $a) (local.get $c)))
          (local.set $odd (f64x2.sub (local.get $a) (local.get $c)))
          (local.set $both (f64x2.add (local.get $b) (local.get $d)))
          (local.set $turned (f64x2.sub (local.get $b) (local.get $d)))
          (local.set $turned
            (f64x2.mul
              (local.get $sign)
              (i8x16.shuffle 8 9 10 11 12 13 14 15 0 1 2 3 4 5 6 7 (local.get $turned) (local.get $turned))))
          (v128.store (local.get $to) (f64x2.add (local.get $even) (local.get $both)))
          (local.set $a (f64x2.sub (local.get $odd) (local.get $turned)))
          (local.set $b (f64x2.sub (local.get $even) (local.get $both)))
          (local.set $c (f64x2.add (local.get $odd) (local.get $turned)))
          (v128.store
            (i32.add (local.get $to) (local.get $step))
            (f64x2.add
              (f64x2.mul (local.get $w1) (local.get $a))
              (f64x2.mul (local.get $v1)
                (i8x16.shuffle 8 9 10 11 12 13 14 15 0 1 2 3 4 5 6 7 (local.get $a) (local.get $a)))))
          (v128.store
            (i32.add (local.get $to) (i32.shl (local.get $step) (i32.const 1)))
            (f64x2.add
              (f64x2.mul (local.get $w2) (local.get $b))
              (f64x2.mul (local.get $v2)
                (i8x16.shuffle 8 9 10 11 12 13 14 15 0 1 2 3 4 5 6 7 (local.get $b) (local.get $b)))))
          (v128.store
            (i32.add (i32.add (local.get $to) (local.get $step)) (i32.shl (local.get $step) (i32.const 1)))
            (f64x2.add
              (f64x2.mul (local.get $w3) (local.get $c))
              (f64x2.mul (local.get $v3)
                (i8x16.shuffle 8 9 10 11 12 13 14 15 0 1 2 3 4 5 6 7 (local.get $c) (local.get $c)))))
          (local.set $from (i32.add (local.get $from) (i32.const 16)))
          (local.set $to (i32.add (local.get $to) (i32.const 16)))
          (br $sequence)))
      ;; Three of the four rows were written beside this one.
      (local.set $to
        (i32.add (i32.add (local.get $to) (local.get $step)) (i32.shl (local.get $step) (i32.const 1))))
      (local.set $turns (i32.add (local.get $turns) (i32.const 48)))
      (local.set $groups (i32.sub (local.get $groups) (i32.const 1)))
      (br $group))))

;; The last stage of a size that is no power of four.
(func $by_two (param $from i32) (param $to i32) (param $stride i32)
  (local $step i32) (local $end i32) (local $a v128) (local $b v128)
  (local.set $step (i32.shl (local.get $stride) (i32.const 4)))
  (local.set $end (i32.add (local.get $from) (local.get $step)))
  (block $done
    (loop $sequence
      (br_if $done (i32.ge_u (local.get $from) (local.get $end)))
      (local.set $a (v128.load (local.get $from)))
      (local.set $b (v128.load (i32.add (local.get $from) (local.get $step))))
      (v128.store (local.get $to) (f64x2.add (local.get $a) (local.get $b)))
      (v128.store (i32.add (local.get $to) (local.get $step)) (f64x2.sub (local.get $a) (local.get $b)))
      (local.set $from (i32.add (local.get $from) (i32.const 16)))
      (local.set $to (i32.add (local.get $to) (i32.const 16)))
      (br $sequence))))
`;
