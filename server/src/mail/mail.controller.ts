import { Controller, Get, Header, Param } from '@nestjs/common';
import { RolesMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { type CapturedMailEntry, MailCaptureService } from './mail-capture.service.js';

/** Captured mail, for administrators. It holds links that open accounts, so a key that may only read does not open it. */
@Controller('api/mail')
@RolesMay('ADMINISTRATOR')
export class MailController {
  constructor(private readonly capture: MailCaptureService) {}

  @Get()
  @Header('Cache-Control', 'no-store')
  async list(@CurrentViewer() viewer: Viewer): Promise<Omit<CapturedMailEntry, 'text'>[]> {
    this.requireCapture(viewer);
    return (await this.capture.list()).map(({ text: _text, ...entry }) => entry);
  }

  @Get(':id')
  @Header('Cache-Control', 'no-store')
  async read(@CurrentViewer() viewer: Viewer, @Param('id') id: string): Promise<CapturedMailEntry> {
    this.requireCapture(viewer);
    const mail = await this.capture.find(id);
    if (!mail) throw new ApiError('NOT_FOUND', 'There is no such message.');
    return mail;
  }

  private requireCapture(viewer: Viewer): void {
    if (viewer.viaApiKey) throw new ApiError('FORBIDDEN', 'Captured mail is not open to API keys.');
    if (!this.capture.isUsed) throw new ApiError('NOT_FOUND', 'Mail goes to a mail server and is not kept here.');
  }
}
