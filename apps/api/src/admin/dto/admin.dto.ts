import {
  accountResponse,
  installationSettings,
  inviteRequest,
  listAccountsRequest,
  listAccountsResponse,
  listAuditRequest,
  listAuditResponse,
  listFailedWorkResponse,
  updateAccountRequest,
  updateInstallationRequest,
} from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ListAccountsDto extends createZodDto(listAccountsRequest) {}
export class ListAccountsResponseDto extends createZodDto(listAccountsResponse) {}
export class AccountResponseDto extends createZodDto(accountResponse) {}
export class UpdateAccountDto extends createZodDto(updateAccountRequest) {}
export class InviteDto extends createZodDto(inviteRequest) {}
export class ListFailedWorkResponseDto extends createZodDto(listFailedWorkResponse) {}
export class ListAuditDto extends createZodDto(listAuditRequest) {}
export class ListAuditResponseDto extends createZodDto(listAuditResponse) {}
export class InstallationSettingsDto extends createZodDto(installationSettings) {}
export class UpdateInstallationDto extends createZodDto(updateInstallationRequest) {}
