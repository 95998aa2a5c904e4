import { Module } from '@nestjs/common';
import { HomeResolver } from './home.resolver.js';
import { HomeService } from './home.service.js';

@Module({ providers: [HomeService, HomeResolver] })
export class HomeModule {}
