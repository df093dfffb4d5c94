import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ReportResponse } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import WaveSurfer from 'wavesurfer.js';
import { Button } from '../../../components/Button';
import { clock } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import type { Listening } from '../hooks/useListening';
import type { TakePeaks } from '../hooks/usePeaks';
import { PlayMark } from '../components/PlayMark';
import { NotePlace } from '../notePlaces';
import { WholeTakeMarks } from './WholeTakeMarks';

const outlinePx = 62;

interface WholeTakeProps {
  report: ReportResponse;
  peaks: TakePeaks;
  listening: Listening;
  chosenHit: number | null;
  canListen: boolean;
}

/** Two filled outlines on one time axis with one playhead line; the part already played keeps its colour. */
export function WholeTake({ report, peaks, listening, chosenHit, canListen }: WholeTakeProps) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const outlines = useRef<HTMLDivElement>(null);
  const playedS = useOutlines({
    container: outlines,
    peaks,
    durationS: report.durationS,
    media: listening.media,
  });
  const plays = listening.playing === 'take';
  return (
    <Box ref={ref} position="relative" marginTop="10px">
      <Box ref={outlines} paddingTop="16px" paddingBottom="26px" aria-hidden />
      <WholeTakeMarks {...{ report, chosenHit, widthPx, outlinePx }} />
      <NotePlace name="pins" />
      {canListen && (
        <Flex gap="16px" alignItems="center" marginTop="8px" _print={{ display: 'none' }}>
          <Button
            look="outline"
            aria-pressed={plays}
            onClick={() => (plays ? listening.stop() : void listening.playTake())}
          >
            <PlayMark playing={plays} />
            {plays ? 'Stop' : 'Play'}
          </Button>
          <Scrubber durationS={report.durationS} playedS={playedS} seek={listening.seek} />
        </Flex>
      )}
    </Box>
  );
}

/** Where it plays, as a slider for keys and for those who can't see the outlines. */
function Scrubber({
  durationS,
  playedS,
  seek,
}: {
  durationS: number;
  playedS: number;
  seek: (timeS: number) => void;
}) {
  return (
    <Flex as="label" alignItems="center" gap="10px" fontSize="small" color="ink.muted" flex="1">
      <span>
        {clock(playedS, true)} of {clock(durationS)}
      </span>
      <chakra.input
        type="range"
        aria-label="Where the take plays"
        aria-valuetext={clock(playedS, true)}
        min={0}
        max={durationS}
        step={0.1}
        value={playedS}
        flex="1"
        accentColor="ink"
        onChange={(event) => seek(Number(event.target.value))}
      />
    </Flex>
  );
}

interface OutlineOptions {
  container: React.RefObject<HTMLDivElement | null>;
  peaks: TakePeaks;
  durationS: number;
  media: HTMLAudioElement;
}

/** @returns where the take stands, in seconds */
function useOutlines({ container, peaks, durationS, media }: OutlineOptions): number {
  const [playedS, setPlayedS] = useState(media.currentTime);
  const theme = useThemeName();
  useEffect(() => {
    if (!container.current) return;
    const color = (token: string) =>
      getComputedStyle(document.documentElement).getPropertyValue(`--chakra-colors-${token}`);
    const channel = (token: string) => ({ waveColor: color(token), progressColor: color(token) });
    const waves = WaveSurfer.create({
      container: container.current,
      media,
      peaks: peaks.outlines.map(toOwnPeak),
      duration: durationS,
      height: outlinePx,
      normalize: false,
      cursorColor: color('ink'),
      cursorWidth: 2,
      dragToSeek: true,
      splitChannels: [channel('kick'), channel('overhead')],
    });
    waves.on('timeupdate', setPlayedS);
    waves.on('seeking', setPlayedS);
    waves.on('interaction', setPlayedS);
    return () => waves.destroy();
  }, [container, peaks, durationS, media, theme]);
  return playedS;
}

/** An overhead recorded low would be a flat line: each track is drawn to its own peak, and the section says so. */
function toOwnPeak(outline: Float32Array): Float32Array {
  const peak = outline.reduce((top, value) => Math.max(top, value), 0);
  return peak > 0 ? outline.map((value) => value / peak) : outline;
}

/** Canvases don't follow the theme by themselves. */
function useThemeName(): string {
  const read = () => (document.documentElement.classList.contains('dark') ? 'dark' : 'light');
  const [name, setName] = useState(read);
  useEffect(() => {
    const observer = new MutationObserver(() => setName(read()));
    observer.observe(document.documentElement, { attributeFilter: ['class'] });
    return () => observer.disconnect();
  }, []);
  return name;
}
