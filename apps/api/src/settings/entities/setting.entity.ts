import { defineEntity, InferEntity, p } from '@mikro-orm/core';

export const settingKeys = ['sample-take', 'account-bytes', 'sign-up'] as const;
export type SettingKey = (typeof settingKeys)[number];

/** What whoever runs this installation decides, one row a decision. */
export const Setting = defineEntity({
  name: 'Setting',
  tableName: 'setting',
  properties: {
    key: p.string().$type<SettingKey>().length(40).primary(),
    value: p.text(),
  },
});
export type Setting = InferEntity<typeof Setting>;
