import { ExportResponse } from '@thudline/contracts';
import { Export } from './entities/export.entity';

export const exportFileName = ({ createdAt }: Export) =>
  `thudline ${createdAt.toISOString().slice(0, 10)}.zip`;

export function exportResponseOf(made: Export): ExportResponse {
  const { id, createdAt, state, progress, reason, bytes, expiresAt } = made;
  return {
    id,
    createdAt: createdAt.toISOString(),
    state,
    progress,
    reason: reason ?? null,
    file:
      bytes && expiresAt ? { name: exportFileName(made), bytes, expiresAt: expiresAt.toISOString() } : null,
  };
}
