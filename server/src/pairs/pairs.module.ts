import { Module } from '@nestjs/common';
import { SubstancesModule } from '../substances/substances.module.js';
import { PairsResolver } from './pairs.resolver.js';
import { PairsService } from './pairs.service.js';

@Module({ imports: [SubstancesModule], providers: [PairsService, PairsResolver], exports: [PairsService] })
export class PairsModule {}
