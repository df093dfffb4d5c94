import { Controller, Get, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { AdminAuditService } from './admin-audit.service';
import { ListAuditDto, ListAuditResponseDto } from './dto/admin.dto';

@ApiTags('admin')
@Controller('api/admin/audit')
export class AdminAuditController {
  constructor(private readonly audit: AdminAuditService) {}

  @Get()
  @Access.role('admin')
  @ZodResponse({ status: 200, type: ListAuditResponseDto })
  list(@Query() query: ListAuditDto) {
    return this.audit.list(query);
  }
}
