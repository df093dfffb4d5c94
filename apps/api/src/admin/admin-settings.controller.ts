import { Body, Controller, Get, Patch } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { InstallationService } from '../settings/installation.service';
import { InstallationSettingsDto, UpdateInstallationDto } from './dto/admin.dto';

@ApiTags('admin')
@Controller('api/admin/settings')
export class AdminSettingsController {
  constructor(
    private readonly installation: InstallationService,
    private readonly audit: AuditService,
  ) {}

  @Get()
  @Access.role('admin')
  @ZodResponse({ status: 200, type: InstallationSettingsDto })
  get() {
    return this.installation.get();
  }

  @Patch()
  @Access.role('admin')
  @ZodResponse({ status: 200, type: InstallationSettingsDto })
  async update(@CurrentViewer() { user }: Viewer, @Body() body: UpdateInstallationDto) {
    await this.installation.update(body);
    await this.audit.write({ kind: 'settings-changed', userId: user.id });
    return this.installation.get();
  }
}
