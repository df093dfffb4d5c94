/** Both ends belong to it. */
export interface Interval {
  readonly low: number;
  readonly high: number;
}
