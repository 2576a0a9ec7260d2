import { Controller, Get } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { ProofDto } from './dto/proof.dto.js';
import { ProofService } from './proof.service.js';

@ApiTags('proof')
@Controller('proof')
export class ProofController {
  constructor(private readonly service: ProofService) {}

  @Get()
  @ApiOperation({
    summary: 'Published cases recomputed on the spot by this installation, beside their sources',
  })
  @ApiProblems()
  prove(): Promise<ProofDto> {
    return this.service.prove();
  }
}
