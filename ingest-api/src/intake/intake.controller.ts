import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { IntakePageDto, IntakeQueryDto, RefusedPostDto } from './dto/intake.dto.js';
import { IntakeService } from './intake.service.js';

@ApiTags('intake')
@Controller('intake')
export class IntakeController {
  constructor(private readonly intake: IntakeService) {}

  @Get()
  @ApiOperation({ summary: 'Everything that came in, accepted or refused, newest first' })
  @ApiProblems(422)
  list(@Query() query: IntakeQueryDto): Promise<IntakePageDto> {
    return this.intake.list(query);
  }

  @Get('refused/:intakeId')
  @ApiOperation({ summary: 'A refused post with its reasons and its body as received' })
  @ApiProblems(404)
  refused(@Param('intakeId') intakeId: string): Promise<RefusedPostDto> {
    return this.intake.refused(intakeId);
  }
}
