import {
  createTryOutRequest,
  listTryOutsResponse,
  tryOutRankingRequest,
  tryOutRankingResponse,
  tryOutResponse,
  updateTryOutPlaceRequest,
  updateTryOutRequest,
} from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class CreateTryOutDto extends createZodDto(createTryOutRequest) {}
export class UpdateTryOutDto extends createZodDto(updateTryOutRequest) {}
export class UpdateTryOutPlaceDto extends createZodDto(updateTryOutPlaceRequest) {}
export class TryOutResponseDto extends createZodDto(tryOutResponse) {}
export class ListTryOutsResponseDto extends createZodDto(listTryOutsResponse) {}
export class TryOutRankingDto extends createZodDto(tryOutRankingRequest) {}
export class TryOutRankingResponseDto extends createZodDto(tryOutRankingResponse) {}
