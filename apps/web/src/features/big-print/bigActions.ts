import type { Finding, FindingStatus, NextAction, ReportResponse } from '@thudline/contracts';

/** One thing to do, in words that can be read from behind the kit. */
export interface BigAction {
  id: string;
  status: FindingStatus;
  strong: string;
  detail: string;
}

/** Which finding an action answers, for its pen mark. */
function topicOf(actionId: string): Finding['topic'] {
  if (actionId === 'kick-gain') return 'kick-level';
  if (actionId === 'overhead-gain') return 'overhead-level';
  if (actionId === 'export-together') return 'late-start';
  if (actionId === 'look-for-noise' || actionId === 'leave-silence') return 'noise';
  return 'adding-up';
}

/** "Turn the kick preamp down 6.5 dB." → "Kick down 6.5 dB". */
function shortened(action: string): string {
  const short = action.replace(/^Turn the (kick|overhead) preamp /, '$1 ').replace(/\.$/, '');
  return short.charAt(0).toUpperCase() + short.slice(1);
}

function wordsOf(action: NextAction): Pick<BigAction, 'strong' | 'detail'> {
  if (action.id === 'flip-overhead')
    return { strong: 'Flip the overhead', detail: 'Press the polarity switch on its preamp.' };
  return {
    strong: shortened(action.action),
    detail: action.detail.replace(/^Your hardest hit/, 'Hardest hit'),
  };
}

/** What to do before the next take, without what is to be left alone. */
export function bigActions({ actions, findings }: Pick<ReportResponse, 'actions' | 'findings'>): BigAction[] {
  return actions
    .filter((action) => !action.leave)
    .map((action) => ({
      id: action.id,
      status: findings.find(({ topic }) => topic === topicOf(action.id))?.status ?? 'cannot-tell',
      ...wordsOf(action),
    }));
}

/** The button for everything: as one would say it of one, two or more things. */
export function allDoneWords(count: number): string {
  if (count === 1) return 'Done';
  return count === 2 ? 'Both done' : 'All done';
}
