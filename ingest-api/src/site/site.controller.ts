import { Controller, Get, Inject } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { Sequelize } from 'sequelize-typescript';
import { StoreUnavailableError } from '../common/errors.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { ampkeepVersion } from '../config/version.js';
import { demoAccounts } from './demo-accounts.js';
import { HealthDto, SiteDto } from './dto/site.dto.js';

@ApiTags('site')
@Controller()
export class SiteController {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    @Inject(ENV) private readonly env: Env,
  ) {}

  @Get('site')
  @ApiOperation({ summary: 'Name and kind of this installation' })
  @ApiProblems()
  site(): SiteDto {
    const demo = this.env.mode === 'demo';
    return {
      name: this.env.siteName,
      timeZone: this.env.timeZone,
      demo,
      localMailbox: this.env.mailTransport === 'local',
      version: ampkeepVersion,
      demoAccounts: demo ? [...demoAccounts] : [],
    };
  }

  @Get('health')
  @ApiOperation({ summary: 'Answers 200 while the database can be read' })
  @ApiProblems(503)
  async health(): Promise<HealthDto> {
    await this.sequelize.query('SELECT 1').catch(() => {
      throw new StoreUnavailableError(5);
    });
    return { status: 'ok', version: ampkeepVersion };
  }
}
