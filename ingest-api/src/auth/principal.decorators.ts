import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { AmpkeepRequest, Person, StationPrincipal } from './principals.js';

const requestOf = (context: ExecutionContext): AmpkeepRequest =>
  context.switchToHttp().getRequest<AmpkeepRequest>();

/** The signed-in person, on routes that only people may use. */
export const CurrentPerson = createParamDecorator(
  (_: unknown, context: ExecutionContext): Person => requestOf(context).person!,
);

/** The station whose key came with the request, on station routes. */
export const CurrentStation = createParamDecorator(
  (_: unknown, context: ExecutionContext): StationPrincipal => requestOf(context).stationPrincipal!,
);
