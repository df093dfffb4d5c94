import {
  createSetupRequest,
  listSetupsResponse,
  setupResponse,
  updateSetupRequest,
} from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class CreateSetupDto extends createZodDto(createSetupRequest) {}
export class UpdateSetupDto extends createZodDto(updateSetupRequest) {}
export class SetupResponseDto extends createZodDto(setupResponse) {}
export class ListSetupsResponseDto extends createZodDto(listSetupsResponse) {}
