import { Controller, Get, Query } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { AuditService } from './audit.service.js';
import { AuditPageDto, toAuditPageDto } from './dto/audit-page.dto.js';
import { AuditQueryDto } from './dto/audit-query.dto.js';

@ApiTags('Accounts')
@Controller('audit')
export class AuditController {
  constructor(private readonly audit: AuditService) {}

  @Get()
  @ApiOperation({ summary: 'Read the audit trail, newest first' })
  @ApiProblems(401, 403, 422)
  async page(@Query() { cursor }: AuditQueryDto): Promise<AuditPageDto> {
    return toAuditPageDto(await this.audit.page(cursor === undefined ? null : Number(cursor)));
  }
}
