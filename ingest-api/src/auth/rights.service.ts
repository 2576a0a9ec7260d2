import { Injectable, RequestMethod } from '@nestjs/common';
import { METHOD_METADATA, PATH_METADATA } from '@nestjs/common/constants.js';
import { DiscoveryService, MetadataScanner } from '@nestjs/core';
import type { AccessKind, RightDto } from './dto/right.dto.js';
import { type Access, rights } from './rights.js';
import { roles } from './roles.js';

const GLOBAL_PREFIX = '/api/v1';

const SWAGGER_OPERATION = 'swagger/apiOperation';

function kindOf(access: Access): AccessKind {
  if (access.public) return 'public';
  if (access.station) return 'station';
  return access.roles?.length === roles.length ? 'anySignedIn' : 'roles';
}

const joined = (...parts: string[]): string =>
  parts
    .map((part) => part.replace(/^\/|\/$/g, ''))
    .filter((part) => part !== '')
    .reduce((path, part) => `${path}/${part}`, GLOBAL_PREFIX);

/** The table of rights in words: each route's own summary stands beside who may use it. */
@Injectable()
export class RightsService {
  constructor(
    private readonly discovery: DiscoveryService,
    private readonly scanner: MetadataScanner,
  ) {}

  list(): RightDto[] {
    const summaries = this.summaries();
    return Object.entries(rights).map(([route, access]) => {
      const [method = '', path = ''] = route.split(' ');
      return {
        method,
        path: path.replace(/:(\w+)/g, '{$1}'),
        summary: summaries.get(route) ?? '',
        access: kindOf(access),
        roles: [...(access.roles ?? [])],
      };
    });
  }

  /** Summary of every handler's operation by its route, as the API docs have it. */
  private summaries(): Map<string, string> {
    const summaries = new Map<string, string>();
    for (const { instance, metatype } of this.discovery.getControllers()) {
      if (!instance || !metatype) continue;
      const prototype = Object.getPrototypeOf(instance) as Record<string, object>;
      const controllerPath = (Reflect.getMetadata(PATH_METADATA, metatype) as string | undefined) ?? '';
      for (const name of this.scanner.getAllMethodNames(prototype)) {
        const handler = prototype[name]!;
        const method = Reflect.getMetadata(METHOD_METADATA, handler) as RequestMethod | undefined;
        if (method === undefined) continue;
        const path = Reflect.getMetadata(PATH_METADATA, handler) as string;
        const operation = Reflect.getMetadata(SWAGGER_OPERATION, handler) as { summary?: string } | undefined;
        summaries.set(`${RequestMethod[method]} ${joined(controllerPath, path)}`, operation?.summary ?? '');
      }
    }
    return summaries;
  }
}
