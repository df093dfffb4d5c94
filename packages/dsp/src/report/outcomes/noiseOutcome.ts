import { noisierMicrophone } from '../../findings/noiseFinding';
import { wholeDbfsText } from '../../findings/words';
import { NOISE_WATCH_DBFS } from '../level';
import { said, type OutcomeRule, type OutcomeSaid } from './outcomeRule';

/** A change of noise worth mentioning: twice the spread of a quiet second's figure (0.7 dB) is hidden well. Our choice. */
const NOISE_STEP_DB = 2;

/** What became of the search for the noise, by the microphone that was the noisier one. */
export const noiseOutcome: OutcomeRule = ({ before, after, doneActions }) => {
  const role = noisierMicrophone(before)?.role ?? 'overhead';
  const [fromDbfs, toDbfs] = [before[role].noiseFloorDbfs, after[role].noiseFloorDbfs];
  if (toDbfs === null) return noSilence();
  const now = `${wholeDbfsText(toDbfs)} dBFS in the ${role}`;
  if (fromDbfs === null) {
    return said(toDbfs <= NOISE_WATCH_DBFS ? 'good' : 'watch', 'The noise can be told now:', `it is ${now}.`);
  }
  const was = `it was ${wholeDbfsText(fromDbfs)}`;
  // Gain raises and lowers noise with everything else, so then the search can't be judged by it.
  if (doneActions.includes(`${role}-gain`)) {
    const quiet = toDbfs <= NOISE_WATCH_DBFS;
    return said(
      quiet ? 'good' : 'cannot-tell',
      quiet ? 'The noise is low enough:' : 'Can’t tell what the search did:',
      `${now}; ${was}, but the preamp was turned too.`,
    );
  }
  const changeDb = toDbfs - fromDbfs;
  if (changeDb > NOISE_STEP_DB) return said('watch', 'It got noisier:', `${now}; ${was}.`);
  if (changeDb > -NOISE_STEP_DB) return said('watch', 'The noise is still there:', `${now}; ${was}.`);
  const down = `The noise is ${Math.round(-changeDb)} dB lower:`;
  return said(toDbfs <= NOISE_WATCH_DBFS ? 'good' : 'watch', down, `${now}; ${was}.`);
};

/** Whether silence was left, and what it shows. */
export const silenceOutcome: OutcomeRule = ({ after }) => {
  const noisier = noisierMicrophone(after);
  if (!noisier) return noSilence();
  const level = wholeDbfsText(noisier.noiseDbfs);
  return noisier.noiseDbfs <= NOISE_WATCH_DBFS
    ? said('good', 'The silence is there:', `noise stays at ${level} dBFS or lower.`)
    : said('watch', 'The silence is there:', `it shows noise at ${level} dBFS in the ${noisier.role}.`);
};

function noSilence(): OutcomeSaid {
  return said('cannot-tell', 'No quiet second was found:', 'leave three seconds silent before playing.');
}
