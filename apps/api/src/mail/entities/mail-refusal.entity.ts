import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { MailChoice } from '@thudline/contracts';

/** An address without an account that wants no such mails. Who has an account says so in their settings. */
export const MailRefusal = defineEntity({
  name: 'MailRefusal',
  tableName: 'mail_refusal',
  primaryKeys: ['emailHash', 'choice'],
  properties: {
    /** SHA-256 of the address in lower case: enough to know it again. */
    emailHash: p.string().length(64).primary(),
    choice: p.string().$type<MailChoice>().length(20).primary(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type MailRefusal = InferEntity<typeof MailRefusal>;
