import { ink } from '../../sheet/pictures/ink';

/** Ring for the take before, disc for the take after. */
export function TakeMark({ which }: { which: 'before' | 'after' }) {
  return (
    <svg width="14" height="14" viewBox="0 0 14 14" aria-hidden style={{ flexShrink: 0 }}>
      {which === 'before' ? (
        <circle cx="7" cy="7" r="5.3" fill={ink.sheet} stroke={ink.ink} strokeWidth="2.2" />
      ) : (
        <circle cx="7" cy="7" r="6" fill={ink.ink} />
      )}
    </svg>
  );
}
