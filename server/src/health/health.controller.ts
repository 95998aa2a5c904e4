import { Controller, Get } from '@nestjs/common';
import { HealthCheck, HealthCheckService, HealthIndicatorService, TypeOrmHealthIndicator } from '@nestjs/terminus';
import { AnyoneMay } from '../common/access.decorators.js';
import { StorageService } from '../storage/storage.service.js';

const DATABASE_PING_TIMEOUT_MS = 1_000;

@Controller('health')
export class HealthController {
  constructor(
    private readonly health: HealthCheckService,
    private readonly indicators: HealthIndicatorService,
    private readonly database: TypeOrmHealthIndicator,
    private readonly storage: StorageService,
  ) {}

  /** The process answers. */
  @Get('live')
  @AnyoneMay()
  live(): { status: 'ok' } {
    return { status: 'ok' };
  }

  /** The server can do its work: 200, or 503 with what is down. */
  @Get('ready')
  @HealthCheck()
  @AnyoneMay()
  ready() {
    return this.health.check([
      () => this.database.pingCheck('database', { timeout: DATABASE_PING_TIMEOUT_MS }),
      () => this.storageCheck(),
    ]);
  }

  private async storageCheck() {
    const indicator = this.indicators.check('storage');
    try {
      await this.storage.ping();
      return indicator.up();
    } catch {
      return indicator.down();
    }
  }
}
