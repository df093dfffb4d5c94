/** An octave by its name: 500 → "500 Hz", 2000 → "2 kHz". */
export const bandName = (centreHz: number) => (centreHz < 1000 ? `${centreHz} Hz` : `${centreHz / 1000} kHz`);
