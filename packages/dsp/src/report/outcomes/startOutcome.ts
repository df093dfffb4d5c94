import { wholeMsText } from '../../findings/words';
import { said, type OutcomeRule } from './outcomeRule';

/** Whether both files start together now. Without kick hits nothing shows it. */
export const startOutcome: OutcomeRule = ({ before, after }) => {
  const was = before.lateStart ? `they were ${wholeMsText(before.lateStart.overheadLateMs)} apart` : '';
  if (after.lateStart) {
    const now = wholeMsText(after.lateStart.overheadLateMs);
    return said('fix', 'The files still start apart:', was ? `${now}; ${was}.` : `${now}.`);
  }
  if (after.arrival.arrivalMs === null) {
    return said('cannot-tell', 'Can’t tell if the files start together:', 'record eight hard kicks.');
  }
  return said('good', 'Both files start together:', was ? `${was}.` : 'how they add can be told.');
};
