import type { NoiseFloorReason } from '../facts';
import { NOISE_WATCH_DBFS } from '../report/level';
import type { Finding, ReportFigures } from '../report/reportTypes';
import { wholeDbfsText } from './words';

/** The noisier of the two microphones, in the quietest second of the take. */
export function noiseFinding(figures: ReportFigures): Finding {
  const noisier = noisierMicrophone(figures);
  if (!noisier) return cannotTell(figures.overhead.noiseFloorReason ?? figures.kick.noiseFloorReason);
  const { role, noiseDbfs } = noisier;
  const level = wholeDbfsText(noiseDbfs);
  if (noiseDbfs <= NOISE_WATCH_DBFS) {
    return {
      topic: 'noise',
      status: 'good',
      sentence: `Noise stays at ${level} dBFS or lower, measured in a quiet second, so it won’t be heard; change nothing.`,
      why: 'Between hits nothing but the room is heard, and it is quiet enough.',
      next: 'Change nothing.',
    };
  }
  return {
    topic: 'noise',
    status: 'watch',
    sentence: `Noise in the ${role} sits at ${level} dBFS and shows between hits; switch off fans and heaters, then record silence again.`,
    why: 'Noise in the recording comes up with every gain that follows.',
    next: 'Switch off what hums or blows, leave three seconds silent, and compare.',
  };
}

/** @returns null where neither microphone has a quiet second */
export function noisierMicrophone(
  figures: ReportFigures,
): { readonly role: 'kick' | 'overhead'; readonly noiseDbfs: number } | null {
  const { kick, overhead } = figures;
  if (kick.noiseFloorDbfs === null && overhead.noiseFloorDbfs === null) return null;
  return (kick.noiseFloorDbfs ?? -Infinity) > (overhead.noiseFloorDbfs ?? -Infinity)
    ? { role: 'kick', noiseDbfs: kick.noiseFloorDbfs ?? 0 }
    : { role: 'overhead', noiseDbfs: overhead.noiseFloorDbfs ?? 0 };
}

const whyNot: Record<NoiseFloorReason, string> = {
  'too-short': 'this take is too short to hold a quiet second',
  'no-quiet-second': 'something always sounds, so there’s no quiet second to measure',
  'digital-silence': 'the quiet parts hold no sound at all, as after a gate or a cut',
};

function cannotTell(reason: NoiseFloorReason | null): Finding {
  return {
    topic: 'noise',
    status: 'cannot-tell',
    sentence: `Can’t tell the noise: ${whyNot[reason ?? 'no-quiet-second']}; leave three seconds silent before playing.`,
    why: 'Noise is measured where nothing else sounds.',
    next: 'Sit still for three seconds before the first hit.',
  };
}
