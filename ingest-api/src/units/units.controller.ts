import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { UnitQueryDto } from './dto/unit-query.dto.js';
import { UnitDto, UnitPageDto } from './dto/unit.dto.js';
import { UnitRouteDto, UnitRouteQueryDto } from './dto/unit-route.dto.js';
import { UnitRoutesService } from './unit-routes.service.js';
import { UnitsService } from './units.service.js';

@ApiTags('units')
@Controller('units')
export class UnitsController {
  constructor(
    private readonly units: UnitsService,
    private readonly routes: UnitRoutesService,
  ) {}

  @Get()
  @ApiOperation({ summary: 'List units by their latest result, the newest first' })
  @ApiProblems(422)
  list(@Query() query: UnitQueryDto): Promise<UnitPageDto> {
    return this.units.list(query);
  }

  @Get(':partNumber/:serialNumber')
  @ApiOperation({ summary: "A unit's whole history, stage by stage" })
  @ApiProblems(404)
  one(
    @Param('partNumber') partNumber: string,
    @Param('serialNumber') serialNumber: string,
  ): Promise<UnitDto> {
    return this.units.one(partNumber, serialNumber);
  }

  @Get(':partNumber/:serialNumber/route')
  @ApiOperation({ summary: 'May this unit be tested at this stage now? For stations' })
  @ApiProblems(404, 422)
  route(
    @Param('partNumber') partNumber: string,
    @Param('serialNumber') serialNumber: string,
    @Query() { stage }: UnitRouteQueryDto,
  ): Promise<UnitRouteDto> {
    return this.routes.route(partNumber, serialNumber, stage);
  }
}
