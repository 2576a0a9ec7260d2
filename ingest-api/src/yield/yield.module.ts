import { Module } from '@nestjs/common';
import { ProductsModule } from '../products/products.module.js';
import { YieldController } from './yield.controller.js';
import { YieldService } from './yield.service.js';

@Module({ imports: [ProductsModule], controllers: [YieldController], providers: [YieldService] })
export class YieldModule {}
