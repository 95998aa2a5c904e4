import { Module } from '@nestjs/common';
import { JobsModule } from '../jobs/jobs.module.js';
import { MailCaptureService } from './mail-capture.service.js';
import { MailController } from './mail.controller.js';
import { MailService } from './mail.service.js';
import { PublicAddressService } from './public-address.service.js';

@Module({
  imports: [JobsModule],
  controllers: [MailController],
  providers: [MailCaptureService, MailService, PublicAddressService],
  exports: [MailService, PublicAddressService],
})
export class MailModule {}
