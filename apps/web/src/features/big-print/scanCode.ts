import { create } from 'qrcode';

/** Light around the code that readers need: 4 modules (ISO/IEC 18004, quiet zone). */
const quietModules = 4;

/** The dark modules of a QR code as one path of unit squares; loaded only when a code is shown. */
export function scanCode(text: string): { sizeModules: number; path: string } {
  const { modules } = create(text, { errorCorrectionLevel: 'M' });
  const squares: string[] = [];
  for (let row = 0; row < modules.size; row++)
    for (let column = 0; column < modules.size; column++)
      if (modules.get(row, column)) squares.push(`M${column + quietModules} ${row + quietModules}h1v1h-1z`);
  return { sizeModules: modules.size + 2 * quietModules, path: squares.join('') };
}
