import { Module } from '@nestjs/common';
import { SubstanceConstantsResolver, SubstancesResolver } from './substances.resolver.js';
import { SubstancesService } from './substances.service.js';

@Module({
  providers: [SubstancesService, SubstancesResolver, SubstanceConstantsResolver],
  exports: [SubstancesService],
})
export class SubstancesModule {}
