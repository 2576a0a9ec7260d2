import { Controller, Get, Query } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { readCursor, toPage } from '../common/cursor.js';
import { PageQueryDto } from '../common/page-query.dto.js';
import { AuditService } from './audit.service.js';
import { AuditPageDto, toAuditEntryDto } from './dto/audit-page.dto.js';

@ApiTags('accounts')
@Controller('audit')
export class AuditController {
  constructor(private readonly audit: AuditService) {}

  @Get()
  @ApiOperation({ summary: 'Read the audit trail, newest first' })
  @ApiProblems(422)
  async page(@Query() { cursor, limit = 50 }: PageQueryDto): Promise<AuditPageDto> {
    const entries = await this.audit.findPage(readCursor(cursor), limit);
    return toPage(entries, limit, ({ auditEntryId }) => auditEntryId, toAuditEntryDto);
  }
}
