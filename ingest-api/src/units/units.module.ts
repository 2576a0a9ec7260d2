import { Module } from '@nestjs/common';
import { ProductsModule } from '../products/products.module.js';
import { ResultsModule } from '../results/results.module.js';
import { UnitsController } from './units.controller.js';
import { UnitRoutesService } from './unit-routes.service.js';
import { UnitsService } from './units.service.js';

@Module({
  imports: [ProductsModule, ResultsModule],
  controllers: [UnitsController],
  providers: [UnitsService, UnitRoutesService],
})
export class UnitsModule {}
