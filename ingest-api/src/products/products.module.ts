import { Module } from '@nestjs/common';
import { CatalogueService } from './catalogue.service.js';
import { ProductsController } from './products.controller.js';

@Module({ controllers: [ProductsController], providers: [CatalogueService], exports: [CatalogueService] })
export class ProductsModule {}
