import { Box } from '@chakra-ui/react';
import { useState, type ReactNode } from 'react';
import { useDropzone } from 'react-dropzone';
import { useFileDrag } from '../hooks/useFileDrag';

export type ChooseFiles = (how?: 'added' | 'replaced') => void;

/** Takes files dropped anywhere in the window, and opens the file chooser for its children. */
export function DropAnywhere({
  onFiles,
  children,
}: {
  onFiles: (files: File[], how: 'added' | 'replaced') => void;
  children: (choose: ChooseFiles) => ReactNode;
}) {
  const dragging = useFileDrag();
  const [how, setHow] = useState<'added' | 'replaced'>('added');
  const { getRootProps, getInputProps, open } = useDropzone({
    noClick: true,
    noKeyboard: true,
    onDrop: (files) => {
      onFiles(files, how);
      setHow('added');
    },
    onFileDialogCancel: () => setHow('added'),
  });
  const choose: ChooseFiles = (what = 'added') => {
    setHow(what);
    open();
  };
  return (
    <>
      {children(choose)}
      <Box
        {...getRootProps()}
        position="fixed"
        inset="0"
        zIndex={20}
        display={dragging ? 'grid' : 'none'}
        placeItems="center"
        alignContent="center"
        bg="sheet"
        opacity={0.94}
      >
        <input {...getInputProps()} aria-label="WAV files" />
        <Box
          position="absolute"
          inset="18px"
          border="2px dashed"
          borderColor="ink"
          borderRadius="3px"
          pointerEvents="none"
        />
        <Box fontSize="section" fontWeight={900} pointerEvents="none">
          Let go to add the files
        </Box>
      </Box>
    </>
  );
}
