import { useEffect, useState } from 'react';

const carriesFiles = (event: DragEvent) => event.dataTransfer?.types.includes('Files') ?? false;

/** Whether files are being held over the window. */
export function useFileDrag(): boolean {
  const [dragging, setDragging] = useState(false);
  useEffect(() => {
    const onEnter = (event: DragEvent) => carriesFiles(event) && setDragging(true);
    const onLeave = (event: DragEvent) => event.relatedTarget === null && setDragging(false);
    const onEnd = () => setDragging(false);
    window.addEventListener('dragenter', onEnter);
    window.addEventListener('dragleave', onLeave);
    window.addEventListener('drop', onEnd, true);
    window.addEventListener('dragend', onEnd);
    return () => {
      window.removeEventListener('dragenter', onEnter);
      window.removeEventListener('dragleave', onLeave);
      window.removeEventListener('drop', onEnd, true);
      window.removeEventListener('dragend', onEnd);
    };
  }, []);
  return dragging;
}
