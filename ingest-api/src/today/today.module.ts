import { Module } from '@nestjs/common';
import { BreachesModule } from '../breaches/breaches.module.js';
import { ProductsModule } from '../products/products.module.js';
import { ResultsModule } from '../results/results.module.js';
import { StationsModule } from '../stations/stations.module.js';
import { TodayController } from './today.controller.js';
import { TodayService } from './today.service.js';

@Module({
  imports: [BreachesModule, ProductsModule, ResultsModule, StationsModule],
  controllers: [TodayController],
  providers: [TodayService],
})
export class TodayModule {}
