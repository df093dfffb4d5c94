/**
 * One hit's attack and decay as a closed shape under a flat line: the belly swells fast and thins out.
 *
 * @param widthPx - of the flat top
 * @param depthPx - of the belly at its deepest, below the line
 * @param startPx - where the belly begins, from the left
 * @param endPx - where it has thinned out
 * @returns an SVG path in px, the top edge at y = 0
 */
export function swellPath({
  widthPx,
  depthPx,
  linePx,
  startPx = 0,
  endPx = widthPx,
}: {
  widthPx: number;
  depthPx: number;
  linePx: number;
  startPx?: number;
  endPx?: number;
}): string {
  const spanPx = endPx - startPx;
  const at = (share: number) => round(startPx + share * spanPx);
  const bottom = linePx + depthPx;
  return [
    `M0 0H${round(widthPx)}V${linePx}H${at(1)}`,
    `C${at(0.72)} ${linePx} ${at(0.55)} ${round(linePx + depthPx * 0.22)} ${at(0.4)} ${round(linePx + depthPx * 0.6)}`,
    `C${at(0.31)} ${round(linePx + depthPx * 0.84)} ${at(0.24)} ${bottom} ${at(0.15)} ${bottom}`,
    `C${at(0.09)} ${bottom} ${at(0.045)} ${round(linePx + depthPx * 0.45)} ${at(0)} ${linePx}`,
    `H0Z`,
  ].join('');
}

function round(value: number) {
  return Math.round(value * 100) / 100;
}
