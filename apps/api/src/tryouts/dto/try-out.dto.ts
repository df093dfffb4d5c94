import {
  addTryOutPlacesRequest,
  createTryOutRequest,
  listTryOutsResponse,
  makeTryOutSetupRequest,
  tryOutRankingRequest,
  tryOutRankingResponse,
  tryOutResponse,
  updateTryOutPlaceRequest,
  updateTryOutRequest,
} from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class CreateTryOutDto extends createZodDto(createTryOutRequest) {}
export class AddTryOutPlacesDto extends createZodDto(addTryOutPlacesRequest) {}
export class UpdateTryOutDto extends createZodDto(updateTryOutRequest) {}
export class UpdateTryOutPlaceDto extends createZodDto(updateTryOutPlaceRequest) {}
export class MakeTryOutSetupDto extends createZodDto(makeTryOutSetupRequest) {}
export class TryOutResponseDto extends createZodDto(tryOutResponse) {}
export class ListTryOutsResponseDto extends createZodDto(listTryOutsResponse) {}
export class TryOutRankingDto extends createZodDto(tryOutRankingRequest) {}
export class TryOutRankingResponseDto extends createZodDto(tryOutRankingResponse) {}
