import { Module } from '@nestjs/common';
import { BreachesModule } from '../breaches/breaches.module.js';
import { IntakeModule } from '../intake/intake.module.js';
import { ProductsModule } from '../products/products.module.js';
import { StationsModule } from '../stations/stations.module.js';
import { ResultReadsService } from './result-reads.service.js';
import { ResultWriter } from './result-writer.js';
import { ResultsController } from './results.controller.js';
import { ResultsService } from './results.service.js';

@Module({
  imports: [BreachesModule, IntakeModule, ProductsModule, StationsModule],
  controllers: [ResultsController],
  providers: [ResultsService, ResultReadsService, ResultWriter],
  exports: [ResultsService, ResultReadsService],
})
export class ResultsModule {}
