import { flipGain } from '../../measurements/agreement/choiceLevels';
import { withLowCut } from '../../measurements/agreement/lowCut';
import { butterworthHighPass } from '../../measurements/filters/butterworth';
import { filtered } from '../../measurements/filters/filterChain';
import { smallKit } from '../smallKit';
import { readMade } from './twoPasses';

/** How far the low cut told from the pair spectrum is from that of an overhead with the switch pressed, dB. */
export async function lowCutErrorDb(delayMs: number): Promise<number> {
  const kit = smallKit({ delayMs, kicks: 6 });
  const cut = filtered(kit.overhead, [butterworthHighPass({ sampleRateHz: kit.sampleRateHz, cutoffHz: 80 })]);
  const plain = await readMade(kit);
  const pressed = await readMade({ ...kit, overhead: Float32Array.from(cut) });
  if (!plain.spectrum || !pressed.spectrum) return NaN;
  const told = flipGain(withLowCut(plain.spectrum), { gainDb: 0 }) ?? NaN;
  return Math.abs(told - (flipGain(pressed.spectrum, { gainDb: 0 }) ?? NaN));
}
