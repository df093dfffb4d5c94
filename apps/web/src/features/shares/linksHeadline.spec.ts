import { sampleShare } from '../../testing/sampleShares';
import { linksHeadline } from './linksHeadline';

const now = new Date('2026-12-04T20:00:00Z');
const opened = sampleShare({ openedAt: '2026-12-04T18:00:00.000Z', openCount: 1 });
const unread = sampleShare();
const ended = sampleShare({ revokedAt: '2026-12-03T18:00:00.000Z' });

describe('the line above all links', () => {
  it.each([
    [[ended], 'No link is open. What you sent can’t be read any more.'],
    [[unread], '1 link is open: it was not opened yet.'],
    [[opened, ended], '1 link is open: it was opened.'],
    [[opened, opened], '2 links are open: all were opened.'],
    [[unread, unread], '2 links are open: none was opened yet.'],
    [[opened, unread], '2 links are open: 1 was not opened yet.'],
  ])('%#: says how many open something, and how many nobody opened', (shares, line) => {
    const { strong, rest } = linksHeadline(shares, now);
    expect(`${strong} ${rest}`).toBe(line);
  });
});
