import { Controller, Get } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { TodayDto } from './dto/today.dto.js';
import { TodayService } from './today.service.js';

@ApiTags('line')
@Controller('today')
export class TodayController {
  constructor(private readonly service: TodayService) {}

  @Get()
  @ApiOperation({ summary: 'The line today: yields, what is getting worse, open breaches, the run of units' })
  @ApiProblems()
  today(): Promise<TodayDto> {
    return this.service.today();
  }
}
