import { PageTitle } from '../components/PageTitle';
import { SheetPaper } from '../components/SheetPaper';
import { RoomsSheet } from '../features/rooms/components/RoomsSheet';

/** The rooms somebody records in. */
export function RoomsPage() {
  return (
    <SheetPaper>
      <PageTitle>Rooms</PageTitle>
      <RoomsSheet />
    </SheetPaper>
  );
}
