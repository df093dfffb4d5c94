import type { Finding, Reader, ReportFigures } from '../report/reportTypes';
import { addingUpFinding } from './addingUpFinding';
import { arrivalFinding } from './arrivalFinding';
import { balanceFindings } from './balanceFindings';
import { dcOffsetFindings } from './dcOffsetFindings';
import { dropoutFindings } from './dropoutFindings';
import { flattenedFindings } from './flattenedFindings';
import { humFindings } from './humFindings';
import { levelFinding } from './levelFinding';
import { lateStartFindings } from './lateStartFindings';
import { noiseFinding } from './noiseFinding';
import { roomFindings } from './roomFindings';
import { oversFindings } from './oversFindings';

/**
 * Everything the sheet says, in the order of the sheet.
 *
 * What was said about the files is kept as it is in `figures`: the same for every reader.
 * @example
 * findings(figures, reader).find(({ topic }) => topic === 'adding-up').status // 'fix'
 */
export function findings(figures: ReportFigures, reader: Reader): Finding[] {
  return [
    ...figures.findings.filter((finding) => finding.topic === 'files'),
    ...lateStartFindings(figures),
    levelFinding(figures, 'kick'),
    levelFinding(figures, 'overhead'),
    ...oversFindings(figures),
    ...flattenedFindings(figures),
    ...dropoutFindings(figures),
    noiseFinding(figures),
    ...humFindings(figures),
    ...dcOffsetFindings(figures),
    arrivalFinding(figures, reader),
    addingUpFinding(figures),
    ...balanceFindings(figures),
    ...roomFindings(figures),
  ];
}
