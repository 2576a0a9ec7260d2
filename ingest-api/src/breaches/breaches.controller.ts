import { Body, Controller, Get, HttpCode, Param, ParseIntPipe, Post, Query } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentPerson } from '../auth/principal.decorators.js';
import type { Person } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { BreachesService } from './breaches.service.js';
import { AcknowledgeBreachDto } from './dto/acknowledge-breach.dto.js';
import { BreachDetailDto } from './dto/breach-detail.dto.js';
import { BreachPageDto } from './dto/breach-page.dto.js';
import { BreachQueryDto } from './dto/breach-query.dto.js';
import { CloseBreachDto } from './dto/close-breach.dto.js';

@ApiTags('breaches')
@Controller('breaches')
export class BreachesController {
  constructor(private readonly breaches: BreachesService) {}

  @Get()
  @ApiOperation({ summary: 'List breaches, newest opened first' })
  @ApiProblems(422)
  list(@Query() query: BreachQueryDto): Promise<BreachPageDto> {
    return this.breaches.list(query);
  }

  @Get(':breachId')
  @ApiOperation({ summary: 'Read a breach with its results and mails' })
  @ApiProblems(400, 404)
  detail(@Param('breachId', ParseIntPipe) breachId: number): Promise<BreachDetailDto> {
    return this.breaches.detail(breachId);
  }

  @Post(':breachId/acknowledge')
  @HttpCode(200)
  @ApiOperation({ summary: 'Say that you take care of an open breach' })
  @ApiProblems(400, 404, 409, 422)
  acknowledge(
    @Param('breachId', ParseIntPipe) breachId: number,
    @Body() { note }: AcknowledgeBreachDto,
    @CurrentPerson() person: Person,
  ): Promise<BreachDetailDto> {
    return this.breaches.acknowledge(breachId, note, person);
  }

  @Post(':breachId/close')
  @HttpCode(200)
  @ApiOperation({ summary: 'Close a breach with its cause and what was done; a later fail opens a new one' })
  @ApiProblems(400, 404, 409, 422)
  close(
    @Param('breachId', ParseIntPipe) breachId: number,
    @Body() closing: CloseBreachDto,
    @CurrentPerson() person: Person,
  ): Promise<BreachDetailDto> {
    return this.breaches.close(breachId, closing, person);
  }
}
