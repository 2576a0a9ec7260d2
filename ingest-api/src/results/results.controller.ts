import { Controller, Get, HttpStatus, Param, Post, Query, Req, Res } from '@nestjs/common';
import {
  ApiBody,
  ApiCreatedResponse,
  ApiOkResponse,
  ApiOperation,
  ApiProduces,
  ApiTags,
} from '@nestjs/swagger';
import type { Response } from 'express';
import { CurrentStation } from '../auth/principal.decorators.js';
import type { AmpkeepRequest, StationPrincipal } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { ResultAnswerDto } from './dto/answer.dto.js';
import { ResultDetailDto } from './dto/result-detail.dto.js';
import { ResultPageDto } from './dto/result-page.dto.js';
import { ResultQueryDto } from './dto/result-query.dto.js';
import { examplePost } from './example-post.js';
import { ResultReadsService } from './result-reads.service.js';
import { ResultsService } from './results.service.js';

@ApiTags('results')
@Controller('results')
export class ResultsController {
  constructor(
    private readonly results: ResultsService,
    private readonly reads: ResultReadsService,
  ) {}

  @Post()
  @ApiOperation({
    summary: 'Post a load-regulation result',
    description:
      '201: stored, on disk. 200: the same resultId with the same content was stored before, this is its answer. ' +
      'A retry is harmless; keep a result until you got 2xx or a 4xx other than 429.',
  })
  @ApiBody({
    schema: { $ref: '#/components/schemas/PostedResult' },
    examples: { sweep: { summary: 'Eight load steps', value: examplePost } },
  })
  @ApiCreatedResponse({ type: ResultAnswerDto, description: 'Stored and judged' })
  @ApiOkResponse({ type: ResultAnswerDto, description: 'Stored before; the first answer again' })
  @ApiProblems(400, 404, 409, 413, 415, 422, 503)
  async record(
    @Req() request: AmpkeepRequest,
    @CurrentStation() station: StationPrincipal,
    @Res({ passthrough: true }) response: Response,
  ): Promise<ResultAnswerDto> {
    const { isNew, answer } = await this.results.receive(request, station);
    response.status(isNew ? HttpStatus.CREATED : HttpStatus.OK);
    return answer;
  }

  @Get()
  @ApiOperation({ summary: 'List results, newest arrival first' })
  @ApiProblems(422)
  list(@Query() query: ResultQueryDto): Promise<ResultPageDto> {
    return this.reads.list(query);
  }

  @Get(':resultId')
  @ApiOperation({ summary: 'One result with its sweep and judging; a station key reads its own' })
  @ApiProblems(404)
  detail(@Param('resultId') resultId: string, @Req() request: AmpkeepRequest): Promise<ResultDetailDto> {
    return this.reads.detail(resultId, request.stationPrincipal);
  }

  @Get(':resultId/post')
  @ApiOperation({ summary: 'The post exactly as it was received' })
  @ApiProduces('application/json')
  @ApiOkResponse({ description: 'The stored bytes', schema: { $ref: '#/components/schemas/PostedResult' } })
  @ApiProblems(404)
  async rawPost(@Param('resultId') resultId: string, @Res() response: Response): Promise<void> {
    response.type('application/json').send(await this.reads.rawPost(resultId));
  }
}
