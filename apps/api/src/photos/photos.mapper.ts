import { PhotoResponse } from '@thudline/contracts';
import { Photo } from './entities/photo.entity';

export const photoResponseOf = ({ id, widthPx, heightPx }: Photo): PhotoResponse => ({
  id,
  widthPx,
  heightPx,
});
