/** Named on every measurement; counts up. A change of what is measured, or how, gets a new one: sheets are then renewed. */
export const dspVersion = '6';

export const isOlder = (version: string): boolean => Number(version) < Number(dspVersion);
