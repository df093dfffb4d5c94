import {
  createRoomChangeRequest,
  createRoomRequest,
  listRoomChangesRequest,
  listRoomChangesResponse,
  listRoomsResponse,
  roomChangeResponse,
  roomResponse,
  roomTrendRequest,
  roomTrendResponse,
  updateRoomChangeRequest,
  updateRoomRequest,
} from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class CreateRoomDto extends createZodDto(createRoomRequest) {}
export class UpdateRoomDto extends createZodDto(updateRoomRequest) {}
export class RoomResponseDto extends createZodDto(roomResponse) {}
export class ListRoomsResponseDto extends createZodDto(listRoomsResponse) {}
export class CreateRoomChangeDto extends createZodDto(createRoomChangeRequest) {}
export class UpdateRoomChangeDto extends createZodDto(updateRoomChangeRequest) {}
export class RoomChangeResponseDto extends createZodDto(roomChangeResponse) {}
export class ListRoomChangesDto extends createZodDto(listRoomChangesRequest) {}
export class ListRoomChangesResponseDto extends createZodDto(listRoomChangesResponse) {}
export class RoomTrendDto extends createZodDto(roomTrendRequest) {}
export class RoomTrendResponseDto extends createZodDto(roomTrendResponse) {}
