import { Body, Controller, Get, Post } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentPerson } from '../auth/principal.decorators.js';
import type { Person } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { CreateStationDto, StationDto } from './dto/station.dto.js';
import { StationsService } from './stations.service.js';

@ApiTags('stations')
@Controller('stations')
export class StationsController {
  constructor(private readonly stations: StationsService) {}

  @Get()
  @ApiOperation({ summary: 'All stations with their state and instruments' })
  @ApiProblems()
  list(): Promise<StationDto[]> {
    return this.stations.list();
  }

  @Post()
  @ApiOperation({ summary: 'Add a station' })
  @ApiProblems(409, 422)
  create(@Body() wanted: CreateStationDto, @CurrentPerson() person: Person): Promise<StationDto> {
    return this.stations.create(wanted, person.email);
  }
}
