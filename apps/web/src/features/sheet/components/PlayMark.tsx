export function PlayMark({ playing }: { playing: boolean }) {
  return (
    <svg width="11" height="12" viewBox="0 0 11 12" fill="currentColor" aria-hidden>
      <path d={playing ? 'M0.5 1h10v10h-10z' : 'M0.5 0.5 10.5 6 0.5 11.5z'} />
    </svg>
  );
}
