/** Named on every measurement. A change of what is measured, or how, gets a new one: takes can then be measured again. */
export const dspVersion = '5';
