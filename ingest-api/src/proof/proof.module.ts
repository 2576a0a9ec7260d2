import { Module } from '@nestjs/common';
import { ProofController } from './proof.controller.js';
import { ProofService } from './proof.service.js';

/** The proof of the computations, for Settings → Proof. */
@Module({ controllers: [ProofController], providers: [ProofService] })
export class ProofModule {}
