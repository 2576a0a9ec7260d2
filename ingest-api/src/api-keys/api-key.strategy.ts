import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { HeaderAPIKeyStrategy } from 'passport-headerapikey';
import type { StationPrincipal } from '../auth/principals.js';
import { ApiKeysService } from './api-keys.service.js';

/** Reads `X-API-Key`. Without request in the callback: with it Nest would take the request for `done`. */
@Injectable()
export class ApiKeyStrategy extends PassportStrategy(HeaderAPIKeyStrategy, 'headerapikey') {
  constructor(private readonly apiKeys: ApiKeysService) {
    super({ header: 'X-API-Key', prefix: '' }, false);
  }

  validate(presented: string): StationPrincipal {
    return this.apiKeys.authenticate(presented);
  }
}
