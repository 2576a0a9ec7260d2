import { Body, Controller, Get, HttpCode, Inject, Param, ParseIntPipe, Post } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentPerson } from '../auth/principal.decorators.js';
import type { Person } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { NotFoundError } from '../common/errors.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { ApiKeysService } from './api-keys.service.js';
import { ApiKeyDto, CreatedApiKeyDto, toApiKeyDto } from './dto/api-key.dto.js';
import { CreateApiKeyDto } from './dto/create-api-key.dto.js';

@ApiTags('stations')
@Controller('stations/:station/keys')
export class ApiKeysController {
  constructor(
    private readonly apiKeys: ApiKeysService,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  @Get()
  @ApiOperation({ summary: "List a station's API keys, newest first" })
  @ApiProblems(404)
  list(@Param('station') station: string): ApiKeyDto[] {
    return this.apiKeys
      .list(station)
      .map((key) => toApiKeyDto(key, this.apiKeys.lastUsedAt(key), this.now()));
  }

  @Post()
  @ApiOperation({ summary: 'Make an API key for a station; the answer is the only place that shows it' })
  @ApiProblems(404, 422)
  async create(
    @Param('station') station: string,
    @Body() wanted: CreateApiKeyDto,
    @CurrentPerson() person: Person,
  ): Promise<CreatedApiKeyDto> {
    const { key, record } = await this.apiKeys.create(station, wanted, person.email);
    return { ...toApiKeyDto(record, null, this.now()), key };
  }

  @Post(':keyId/revoke')
  @HttpCode(200)
  @ApiOperation({ summary: 'Revoke an API key; the next post with it is refused' })
  @ApiProblems(404)
  async revoke(
    @Param('station') station: string,
    @Param('keyId', new ParseIntPipe({ exceptionFactory: () => new NotFoundError('A key of this number') }))
    keyId: number,
    @CurrentPerson() person: Person,
  ): Promise<ApiKeyDto> {
    const key = await this.apiKeys.revoke(station, keyId, person.email);
    return toApiKeyDto(key, this.apiKeys.lastUsedAt(key), this.now());
  }
}
