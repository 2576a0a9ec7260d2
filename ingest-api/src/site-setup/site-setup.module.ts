import { Module } from '@nestjs/common';
import { ProductsModule } from '../products/products.module.js';
import { StationsModule } from '../stations/stations.module.js';
import { SiteSetupService } from './site-setup.service.js';

@Module({
  imports: [ProductsModule, StationsModule],
  providers: [SiteSetupService],
  exports: [SiteSetupService],
})
export class SiteSetupModule {}
