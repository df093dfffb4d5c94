import { draftFault, emptyDraft, shareRequest } from './shareDraft';

const take = { kind: 'take', takeId: '01890000-0000-7000-8000-000000000001' } as const;
const room = { kind: 'room', roomId: '01890000-0000-7000-8000-000000000002' } as const;

describe('a link as it is written', () => {
  it('opens for a week to read and hear unless told otherwise', () => {
    expect(shareRequest(take, emptyDraft)).toEqual({
      subject: take,
      label: '',
      question: '',
      expiresInDays: 7,
      canListen: true,
      canDownload: false,
      canNote: false,
    });
  });

  it('ends with the chosen day, by hand, or after so many days', () => {
    const chosen = shareRequest(take, { ...emptyDraft, openFor: 'day', day: '2026-12-24' });
    expect(chosen).toMatchObject({ expiresAt: new Date('2026-12-24T23:59:59').toISOString() });
    expect(shareRequest(take, { ...emptyDraft, openFor: 'never' })).toMatchObject({ expiresInDays: null });
    expect(shareRequest(take, { ...emptyDraft, openFor: '30' })).toMatchObject({ expiresInDays: 30 });
    expect(draftFault({ ...emptyDraft, openFor: 'day' })).toBe('Choose the day until which it opens.');
    expect(draftFault(emptyDraft)).toBe('');
  });

  it('names passphrase and mail address only where they are written, without the spaces around', () => {
    expect(
      shareRequest(take, { ...emptyDraft, passphrase: ' brushes ', mailTo: ' bex@example.org ' }),
    ).toMatchObject({ passphrase: 'brushes', mailTo: 'bex@example.org' });
    expect(shareRequest(take, { ...emptyDraft, passphrase: '  ' })).not.toHaveProperty('passphrase');
  });

  it('lets a room’s log only be read', () => {
    expect(shareRequest(room, emptyDraft)).toMatchObject({ canListen: false });
  });

  it('lets files and notes go only with a sheet, whatever was ticked', () => {
    const ticked = { ...emptyDraft, canDownload: true, canNote: true };
    expect(shareRequest(take, ticked)).toMatchObject({ canDownload: true, canNote: true });
    expect(shareRequest(room, ticked)).toMatchObject({ canDownload: false, canNote: false });
  });
});
