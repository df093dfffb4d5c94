import { useNavigate } from 'react-router-dom';
import { PageTitle } from '../components/PageTitle';
import { SheetPaper } from '../components/SheetPaper';
import { TakesSheet } from '../features/takes/components/TakesSheet';
import { DropAnywhere } from '../features/upload/components/DropAnywhere';
import { handOverFiles } from '../features/upload/droppedFiles';

/** The list of takes; files dropped on it open the page that adds one. */
export function TakesPage() {
  const navigate = useNavigate();
  const addTake = (files: File[]) => {
    handOverFiles(files);
    void navigate('/takes/new');
  };
  return (
    <DropAnywhere onFiles={addTake}>
      {() => (
        <SheetPaper>
          <PageTitle>Takes</PageTitle>
          <TakesSheet />
        </SheetPaper>
      )}
    </DropAnywhere>
  );
}
