import { Module } from '@nestjs/common';
import { PeopleResolver } from './people.resolver.js';
import { PeopleService } from './people.service.js';

@Module({ providers: [PeopleService, PeopleResolver], exports: [PeopleService] })
export class PeopleModule {}
