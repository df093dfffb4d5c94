import { z } from 'zod';

/** Control characters (general category Cc) and surrogates without their other half (Cs): a database can't keep them. */
const unseen = /[\p{Cc}\p{Cs}]/u;
const unseenButLines = /(?![\n\t])[\p{Cc}\p{Cs}]/u;

/**
 * One line of text that somebody writes, without the spaces around it.
 *
 * @param error - the sentence for what is no text at all
 */
export const text = (error?: string) =>
  z
    .string(error === undefined ? undefined : { error })
    .trim()
    .refine((written) => !unseen.test(written), 'Write it in one line, without characters that nobody sees.');

/** Text of several lines; forms send each line's end as CR LF, here it is LF. */
export const textOfLines = () =>
  z
    .string()
    .trim()
    .overwrite((written) => written.replace(/\r\n?/g, '\n'))
    .refine((written) => !unseenButLines.test(written), 'Leave out the characters that nobody sees.');
