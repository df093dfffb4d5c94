import { applyDecorators } from '@nestjs/common';
import { ApiBody, ApiConsumes, ApiResponse } from '@nestjs/swagger';

/** What the documentation says of an upload of a photo, whose body no pipe sees. */
export function ApiPhotoUpload() {
  return applyDecorators(
    ApiConsumes('multipart/form-data'),
    ApiBody({
      schema: {
        type: 'object',
        required: ['photo'],
        properties: { photo: { type: 'string', format: 'binary', description: 'JPEG, PNG or WebP' } },
      },
    }),
    ApiResponse({ status: 413, description: 'The photo is larger than 10 MB.' }),
    ApiResponse({ status: 422, description: 'This is no photo that can be read.' }),
  );
}
