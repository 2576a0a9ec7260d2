import { Controller, Get, Inject } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { CatalogueService } from './catalogue.service.js';
import { ProductDto, toProductDto } from './dto/product.dto.js';

@ApiTags('products')
@Controller('products')
export class ProductsController {
  constructor(
    private readonly catalogue: CatalogueService,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  @Get()
  @ApiOperation({ summary: 'Products with their stages, and the test plans and limits in force' })
  @ApiProblems()
  list(): ProductDto[] {
    return this.catalogue.all().map((product) => toProductDto(product, this.now()));
  }
}
