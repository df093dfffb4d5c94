import { applyDecorators } from '@nestjs/common';
import { ApiBody, ApiConsumes, ApiResponse } from '@nestjs/swagger';
import { uploadLimits } from '@thudline/contracts';

/** What the documentation says of the upload, whose body no pipe sees. */
export function ApiTakeUpload() {
  return applyDecorators(
    ApiConsumes('multipart/form-data'),
    ApiBody({
      description: 'The text fields first, then the files.',
      schema: {
        type: 'object',
        required: ['uploadKey', 'tracks', 'files'],
        properties: {
          uploadKey: {
            type: 'string',
            format: 'uuid',
            description: 'The same key again gives the same take.',
          },
          title: { type: 'string', maxLength: 120 },
          note: { type: 'string', maxLength: 4000 },
          recordedAt: { type: 'string', format: 'date-time' },
          followsTakeId: {
            type: 'string',
            format: 'uuid',
            description: 'The player’s earlier take that this one follows.',
          },
          setupId: {
            type: 'string',
            format: 'uuid',
            description: 'The player’s setup it was recorded with.',
          },
          roomId: { type: 'string', format: 'uuid', description: 'The player’s room it was recorded in.' },
          doneActions: { type: 'string', description: 'JSON: ids of the actions carried out before it' },
          tags: { type: 'string', description: 'JSON: ["…", …]' },
          tracks: { type: 'string', description: 'JSON: [{ role, fileIndex, channel }, …]' },
          files: {
            type: 'array',
            maxItems: uploadLimits.maxFiles,
            items: { type: 'string', format: 'binary' },
          },
        },
      },
    }),
    ApiResponse({ status: 200, description: 'The take that was made with this uploadKey before.' }),
    ApiResponse({ status: 413, description: 'A file is larger than the limit.' }),
    ApiResponse({ status: 422, description: 'A file can’t be measured; one sentence says why.' }),
    ApiResponse({ status: 503, description: 'The object store does not answer; nothing was stored.' }),
  );
}
