import { eventNames, measurementEvent, paths, takeAddedEvent } from '@thudline/contracts';
import { useEffect, useEffectEvent, useState } from 'react';
import { useSWRConfig } from 'swr';
import { isTakesKey } from './takesKeys';
import { useMeasurementNews } from './useMeasurementNews';

/** How often to ask where the stream is not open; a stage of a measurement takes about a second. */
const pollMs = 1000;
/** How often to ask in spite of an open stream: makes good an event that got lost. */
const slowPollMs = 20_000;
/** When a refused stream is tried again: by then asking has renewed a session that had ended. */
const reopenMs = 30_000;

interface MeasurementEvents {
  /** The takes to follow; none closes the stream, unless `waitForAdded`. */
  takeIds: readonly string[];
  /** Reads the same thing without the stream. */
  askAgain: () => void;
  /** Keeps listening for takes that are added elsewhere. */
  waitForAdded?: boolean;
  /** Nobody sits and waits: where the stream can't be opened it is asked seldom. */
  patient?: boolean;
}

/**
 * Follows measurements: what the server tells goes into the SWR caches of the list and the item. Where the stream can't
 * be opened, `askAgain` is called every second instead.
 */
export function useMeasurementEvents({
  takeIds,
  askAgain,
  waitForAdded = false,
  patient = false,
}: MeasurementEvents) {
  const followed = takeIds.join(',');
  const wanted = followed !== '' || waitForAdded;
  const live = useEventStream(followed, wanted);
  const ask = useEffectEvent(askAgain);
  useEffect(() => {
    if (!wanted) return;
    const timer = setInterval(() => !document.hidden && ask(), live || patient ? slowPollMs : pollMs);
    return () => clearInterval(timer);
  }, [wanted, live, patient]);
}

function useEventStream(followed: string, wanted: boolean): boolean {
  const tell = useMeasurementNews();
  const { mutate } = useSWRConfig();
  const [live, setLive] = useState(false);
  const [attempt, setAttempt] = useState(0);
  const onEvent = useEffectEvent((name: string, text: string) => {
    if (name === eventNames.measurement) return tell(measurementEvent.parse(JSON.parse(text)));
    takeAddedEvent.parse(JSON.parse(text));
    void mutate(isTakesKey);
  });
  useEffect(() => {
    if (!wanted || typeof EventSource === 'undefined') return;
    const stream = new EventSource(`${paths.events}?${new URLSearchParams({ takes: followed }).toString()}`);
    let reopen: ReturnType<typeof setTimeout> | undefined;
    stream.onopen = () => setLive(true);
    stream.onerror = () => {
      setLive(false);
      // Lost connections are taken up again by the browser; a refusal is not.
      if (stream.readyState === EventSource.CLOSED)
        reopen = setTimeout(() => setAttempt(attempt + 1), reopenMs);
    };
    for (const name of Object.values(eventNames))
      stream.addEventListener(name, (event: MessageEvent<string>) => onEvent(name, event.data));
    return () => {
      clearTimeout(reopen);
      stream.close();
      setLive(false);
    };
  }, [followed, wanted, attempt]);
  return live;
}
