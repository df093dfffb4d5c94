import { chakra } from '@chakra-ui/react';
import type { RoomResponse } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { TextLink } from '../../../components/TextLink';
import { dayWords, sizeWords } from '../roomWords';

/** The ruled table of rooms; on a phone each row folds. */
export function RoomsTable({
  rooms,
  lengthUnit,
}: {
  rooms: readonly RoomResponse[];
  lengthUnit: 'metre' | 'foot';
}) {
  return (
    <chakra.table width="100%" marginTop="14px" fontSize={{ base: 'small', md: 'body' }}>
      <thead>
        <chakra.tr borderBottom="2px solid" borderColor="ink" fontSize="caption" color="ink.muted">
          {['Room', 'Size', 'Changes', 'Takes', 'Last take'].map((head) => (
            <chakra.th
              key={head}
              scope="col"
              textAlign="left"
              fontWeight={400}
              paddingY="6px"
              paddingRight="12px"
              display={head === 'Size' ? { base: 'none', md: 'table-cell' } : undefined}
            >
              {head}
            </chakra.th>
          ))}
        </chakra.tr>
      </thead>
      <tbody>
        {rooms.map((room) => (
          <chakra.tr key={room.id} borderBottom="1px solid" borderColor="rule" height="52px">
            <chakra.th scope="row" textAlign="left" fontWeight={600} paddingRight="12px">
              <TextLink to={`/rooms/${room.id}`} display="inline-block" paddingY="8px">
                {room.name}
              </TextLink>
            </chakra.th>
            <Cell onlyWide>{sizeWords(room.shape, lengthUnit) || '–'}</Cell>
            <Cell>{room.changeCount}</Cell>
            <Cell>{room.takeCount}</Cell>
            <Cell>{room.lastTakeAt ? dayWords(room.lastTakeAt) : '–'}</Cell>
          </chakra.tr>
        ))}
      </tbody>
    </chakra.table>
  );
}

function Cell({ onlyWide = false, children }: { onlyWide?: boolean; children: ReactNode }) {
  return (
    <chakra.td paddingRight="12px" display={onlyWide ? { base: 'none', md: 'table-cell' } : undefined}>
      {children}
    </chakra.td>
  );
}
