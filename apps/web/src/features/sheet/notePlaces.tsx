import { chakra } from '@chakra-ui/react';
import type { ReportResponse, TakeResponse, UserSettings } from '@thudline/contracts';
import { createContext, useCallback, useContext, useState } from 'react';
import type { Listening } from './hooks/useListening';

/** Where notes stand on a sheet, by name: the sheet can be read before what fills them is loaded. */
export type NotePlaces = Readonly<Record<string, HTMLElement>>;

/** What notes need of the sheet they stand on. */
export interface SheetNotesProps {
  take: TakeResponse;
  report: ReportResponse;
  settings: UserSettings;
  listening: Listening;
  chosenHit: number | null;
  places: NotePlaces;
}

const Register = createContext<((name: string, element: HTMLElement | null) => void) | null>(null);

export const NotePlacesProvider = Register.Provider;

export function useNotePlaces() {
  const [places, setPlaces] = useState<NotePlaces>({});
  const register = useCallback((name: string, element: HTMLElement | null) => {
    setPlaces((before) => {
      const others = Object.entries(before).filter(([other]) => other !== name);
      return Object.fromEntries(element ? [...others, [name, element]] : others);
    });
  }, []);
  return { places, register };
}

const Empty = chakra('div', { base: { _empty: { display: 'none' } } });

/** An empty place on the sheet; not there at all on a sheet without notes. */
export function NotePlace({ name, as }: { name: string; as?: 'span' | 'li' | 'ul' }) {
  const register = useContext(Register);
  const ref = useCallback((element: HTMLElement | null) => register?.(name, element), [register, name]);
  return register && <Empty as={as} ref={ref} data-note-place={name} />;
}
