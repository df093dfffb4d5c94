import type { ReportResponse, TakeResponse } from '@thudline/contracts';
import { csvRow } from '../../lib/csv';
import { type FigureGroup } from './components/figureRows';

/** Spreadsheets read a hyphen as the minus sign, and nothing else. */
const plainNumber = (text: string) => text.replaceAll('−', '-').replace(/^–$/, '');

/** A figure with more columns than the two microphones becomes one for each of them: "Decay, 500 Hz". */
const oneOrTwoValues = ({ columns, rows }: FigureGroup) =>
  rows.flatMap((figure) =>
    figure.values.length <= 2
      ? [figure]
      : figure.values.map((value, i) => ({
          ...figure,
          label: `${figure.label}, ${columns[i]}`,
          values: [value],
        })),
  );

/** All figures as comma-separated values: section, figure, unit, kick (or both), overhead, definition. */
export function figuresCsv(groups: readonly FigureGroup[]): string {
  const head = ['section', 'figure', 'unit', 'kick or both', 'overhead', 'definition', 'source'];
  const rows = groups.flatMap((group) =>
    oneOrTwoValues(group).map(({ label, unit, values, definition, source }) => [
      group.title,
      label,
      unit,
      plainNumber(values[0] ?? ''),
      plainNumber(values[1] ?? ''),
      definition,
      source,
    ]),
  );
  return [head, ...rows].map(csvRow).join('\r\n') + '\r\n';
}

/** All figures for pasting into a message: one line a figure. */
export function figuresText(groups: readonly FigureGroup[]): string {
  return groups
    .map(({ title, columns, rows }) =>
      [
        title,
        ...rows.map(({ label, unit, values }) => {
          const told = values
            .map((value, i) => (values.length > 1 ? `${columns[i]} ${value}` : value))
            .join(', ');
          return unit === 'about' ? `${label}: about ${told}` : `${label}: ${told} ${unit}`.trim();
        }),
      ].join('\n'),
    )
    .join('\n\n');
}

/** The report as the server told it, for programs. */
export const figuresJson = (report: ReportResponse): string => JSON.stringify(report, null, 2);

/** "take-14-8-cm-inside.csv": letters and digits only, so that every system takes it. */
export function figuresFileName(
  { number, title }: Pick<TakeResponse, 'number' | 'title'>,
  ending: 'csv' | 'json',
): string {
  const words = `take ${number} ${title}`
    .toLowerCase()
    .normalize('NFKD')
    .replace(/[^a-z0-9]+/g, '-');
  return `${words.replace(/^-|-$/g, '').slice(0, 60)}.${ending}`;
}
