import { Controller, Get } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { Test } from '@nestjs/testing';
import request from 'supertest';
import type { App } from 'supertest/types.js';
import { ProblemFilter } from '../common/problem.filter.js';
import { ENV } from '../config/config.module.js';
import { SessionsService } from '../users/sessions.service.js';
import { AccessGuard } from './access.guard.js';
import { SessionCookie } from './session-cookie.js';
import { StationKeyGuard } from './station-key.guard.js';

@Controller()
class ForgottenController {
  @Get('forgotten')
  forgotten(): string {
    return 'a secret';
  }
}

describe('the access guard', () => {
  it('refuses a route that the table of rights lacks, whoever asks', async () => {
    const module = await Test.createTestingModule({
      controllers: [ForgottenController],
      providers: [
        { provide: ENV, useValue: { publicUrl: 'http://localhost:4780' } },
        { provide: SessionsService, useValue: {} },
        { provide: SessionCookie, useValue: {} },
        StationKeyGuard,
        { provide: APP_GUARD, useClass: AccessGuard },
      ],
    }).compile();
    const app = module
      .createNestApplication()
      .setGlobalPrefix('api/v1')
      .useGlobalFilters(new ProblemFilter());
    await app.init();
    const answer = await request(app.getHttpServer() as App).get('/api/v1/forgotten');
    expect(answer.status).toBe(403);
    expect(answer.body).toMatchObject({
      code: 'forbidden',
      detail: expect.stringContaining('table of rights'),
    });
    await app.close();
  });
});
