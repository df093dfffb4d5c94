import { levelStatus, raisedNoiseDbfs } from '../report/level';
import type { Finding, ReportFigures } from '../report/reportTypes';
import { clippedHits } from './clippedHits';
import { capitalised, counted, decimalText, halfDbText, wholeDbfsText } from './words';

type Said = Pick<Finding, 'sentence' | 'why' | 'next'>;
type Role = 'kick' | 'overhead';

/**
 * How loud one microphone was recorded, and what to turn its preamp by: in the half-decibel steps of the tick box and the
 * picture, so that one fault has one number everywhere.
 */
export function levelFinding(figures: ReportFigures, role: Role): Finding {
  return { topic: `${role}-level`, status: levelStatus(figures[role]), ...said(figures, role) };
}

function said(figures: ReportFigures, role: Role): Said {
  switch (figures[role].level) {
    case null:
      return noHit(figures, role);
    case 'clipped':
      return clipped(figures, role);
    case 'hot':
      return hot(figures, role);
    case 'on-target':
      return onTarget(figures, role);
    case 'low':
      return low(figures, role);
  }
}

function noHit(figures: ReportFigures, role: Role): Said {
  const silent = figures[role].samplePeakDbfs === null;
  return {
    sentence: silent
      ? `Can’t tell the ${role} level: its file is silent; check cable, input and phantom power, then record again.`
      : `Can’t tell the ${role} level: no hit was found in this take; record your hardest hits.`,
    why: 'The level is judged by the loudest hit, and none was found.',
    next: silent
      ? 'Mute the monitors before switching phantom power. Then record a short take and look for a level.'
      : 'Record eight hard kicks and your loudest groove.',
  };
}

function clipped(figures: ReportFigures, role: Role): Said {
  const track = figures[role];
  const hits = clippedHits(figures, track);
  const which =
    hits > 0
      ? `${capitalised(counted(hits, `${role} hit`))} ${hits === 1 ? 'is' : 'are'} flattened`
      : `The ${role} is flattened in ${counted(track.clipping.runCount, 'place')}`;
  const least = halfDbText(track.gainChangeDb ?? 0);
  return {
    sentence: `${which} because the input overloaded; turn the ${role} preamp down at least ${least} dB and play again.`,
    why: 'A flattened peak can’t be repaired, and how far over the top it went can’t be seen.',
    next: `Turn the ${role} preamp down at least ${least} dB and record the take again.`,
  };
}

function hot(figures: ReportFigures, role: Role): Said {
  const track = figures[role];
  const peak = decimalText(track.loudestHitDbfs ?? 0);
  const change = halfDbText(track.gainChangeDb ?? 0);
  const between = track.truePeakDbtp ?? 0;
  return {
    sentence: `${capitalised(role)} peaks at ${peak} dBFS, unclipped: this take is fine, but a harder hit would clip; turn the ${role} preamp down ${change} dB.`,
    why: `Nothing is lost in this take. A clipped hit could not be repaired.${
      // What a decimal shows: a wave that passes full scale between its samples clips when it is played or converted.
      between >= 0.05 ? ` Between samples the wave already reaches ${decimalText(between)} dBTP.` : ''
    }`,
    next: `Turn the ${role} preamp down ${change} dB before the next take.`,
  };
}

function onTarget(figures: ReportFigures, role: Role): Said {
  const peakDbfs = figures[role].loudestHitDbfs ?? 0;
  const room = Math.max(0, Math.floor(-peakDbfs));
  return {
    sentence: `${capitalised(role)} peaks at ${decimalText(peakDbfs)} dBFS, on target, so a hit ${room} dB harder still fits; leave the ${role} preamp alone.`,
    why: 'Loud enough to stay clear of the noise, with room for a harder hit.',
    next: `Leave the ${role} preamp where it is.`,
  };
}

function low(figures: ReportFigures, role: Role): Said {
  const track = figures[role];
  const peak = decimalText(track.loudestHitDbfs ?? 0);
  const change = halfDbText(track.gainChangeDb ?? 0);
  const noise = raisedNoiseDbfs(track);
  const next = `Lower the headphones, then turn the ${role} preamp up ${change} dB.`;
  if (levelStatus(track) === 'good') {
    return {
      sentence: `${capitalised(role)} peaks at ${peak} dBFS, below target but ${noise === null ? 'loud enough' : 'clear of the noise'}: this take is fine, and ${change} dB more would fit.`,
      why: 'It can be raised later without harm.',
      next: `${next} It can also stay where it is.`,
    };
  }
  const name = capitalised(role);
  return {
    sentence:
      noise === null
        ? `${name} peaks at only ${peak} dBFS; raising it later lifts the noise too, so turn the ${role} preamp up ${change} dB now.`
        : `${name} peaks at ${peak} dBFS; raising it ${change} dB later lifts noise to ${wholeDbfsText(noise)}, so turn the ${role} preamp up ${change} dB now.`,
    why: 'Gain at the preamp raises the drum above the noise that comes after it; gain later raises both.',
    next,
  };
}
