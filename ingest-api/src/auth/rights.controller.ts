import { Controller, Get } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { RightDto } from './dto/right.dto.js';
import { RightsService } from './rights.service.js';

@ApiTags('accounts')
@Controller('rights')
export class RightsController {
  constructor(private readonly rights: RightsService) {}

  @Get()
  @ApiOperation({ summary: 'Which role may do what' })
  @ApiProblems()
  list(): RightDto[] {
    return this.rights.list();
  }
}
