import { Body, Controller, Delete, Get, Header, HttpCode, HttpException, Param, Post } from '@nestjs/common';
import { readBody } from '../auth/auth.bodies.js';
import { RolesMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { type ReadAnswer } from './bring-in.answers.js';
import { KeepBody, ReadBody } from './bring-in.bodies.js';
import { BringInService, type Kept } from './bring-in.service.js';
import { type ImportProgress } from './imports.js';
import { UnreadableTable } from './table.js';

@Controller('api/bring-in')
@RolesMay('RESEARCHER', 'EDITOR')
export class BringInController {
  constructor(private readonly bringIn: BringInService) {}

  /** What is understood of a table; changes nothing. */
  @Post('read')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  read(@Body() body: unknown, @CurrentViewer() viewer: Viewer): Promise<ReadAnswer> {
    return sayingWhy(() => this.bringIn.read(readBody(ReadBody, body), viewer));
  }

  /** Keeps a table as a new series, whole or not at all. */
  @Post('keep')
  @HttpCode(201)
  async keep(@Body() body: unknown, @CurrentViewer() viewer: Viewer): Promise<Kept> {
    const outcome = await sayingWhy(() => this.bringIn.keep(readBody(KeepBody, body), viewer));
    if (outcome.ok) return outcome.value;
    const message = 'Nothing was stored. What has to be mended or decided stands at its place.';
    throw new HttpException({ message, code: 'BAD_INPUT', problems: outcome.problems }, 422);
  }

  @Get('imports/:id')
  @Header('Cache-Control', 'no-store')
  progress(@Param('id') id: string, @CurrentViewer() viewer: Viewer): ImportProgress {
    return found(this.bringIn.progress(id, viewer));
  }

  /** Stops an import that is not storing yet. */
  @Delete('imports/:id')
  cancel(@Param('id') id: string, @CurrentViewer() viewer: Viewer): ImportProgress {
    return found(this.bringIn.cancel(id, viewer));
  }
}

function found(progress: ImportProgress | null): ImportProgress {
  if (!progress) throw new ApiError('NOT_FOUND', 'There is no such import.');
  return progress;
}

/** What cannot be read as a table is told in its own words. */
async function sayingWhy<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    if (!(error instanceof UnreadableTable)) throw error;
    throw new HttpException(
      {
        message: error.message,
        code: error.code,
        problems: [{ code: 'BAD_INPUT', message: error.message, path: 'file' }],
      },
      422,
    );
  }
}
