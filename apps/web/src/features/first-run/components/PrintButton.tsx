import { TextButton } from '../../../components/Button';

export function PrintButton() {
  return (
    <TextButton type="button" paddingY="8px" onClick={() => window.print()}>
      Print this
    </TextButton>
  );
}
