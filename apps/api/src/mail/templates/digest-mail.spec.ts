import { digestMail, Week } from './digest-mail';
import { withWayOut } from './way-out';

const quiet: Week = { takes: [], notes: 0, opened: 0, changes: [] };
const told = (week: Partial<Week>) =>
  digestMail({ name: 'Juno', week: { ...quiet, ...week }, url: 'http://thudline.test/takes' });

describe('the mail about a week', () => {
  it('tells what the newest sheet says', () => {
    const summary = { strong: 'Flip the overhead.', rest: '' } as Week['takes'][number]['summary'];
    const { subject, text } = told({
      takes: [
        { number: 14, title: '', summary: null },
        { number: 15, title: 'Loud chorus', summary },
      ],
    });
    expect(subject).toBe('Your week: 2 takes');
    expect(text).toContain(
      'You recorded 2 takes. The newest, take 15, Loud chorus, says: Flip the overhead.',
    );
  });

  it('tells of takes without a sheet, changes, notes and sheets opened', () => {
    const { subject, text } = told({
      takes: [{ number: 1, title: '', summary: null }],
      changes: [{ what: 'Rug', room: 'Garage' }],
      notes: 1,
      opened: 2,
    });
    expect(subject).toBe('Your week: 1 take, 1 change, 1 note, 2 sheets opened');
    expect(text).toContain(
      'this was your week. You recorded 1 take. In your room’s log: Rug (Garage). 1 note was left on your sheets, and 2 sheets you sent were opened.',
    );
  });
});

it('a mail that somebody chose says why it comes and how it stops, as text and as HTML', () => {
  const mail = withWayOut(told({ opened: 1 }), 'digest', 'http://thudline.test/unsubscribe/a?x=1&y=2');
  expect(mail.text).toContain(
    '\n-- \nYou get this once a week. Stop these mails: http://thudline.test/unsubscribe/a?x=1&y=2\n',
  );
  expect(mail.html).toContain('href="http://thudline.test/unsubscribe/a?x=1&amp;y=2"');
});
