import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { AppError } from '../../errors/app-error';
import { InstallationService } from '../../settings/installation.service';
import { storedBytes } from '../../storage/stored-bytes';
import { User } from '../../users/entities/user.entity';

const told = (bytes: number) =>
  bytes >= 1e9 ? `${(bytes / 1e9).toFixed(1)} GB` : `${Math.round(bytes / 1e6)} MB`;

/** How much one account may keep. */
@Injectable()
export class UploadQuota {
  constructor(
    private readonly em: EntityManager,
    private readonly installation: InstallationService,
  ) {}

  /** @throws {AppError} `too-large` where so much more is more than there is room for */
  async check(user: User, moreBytes: number): Promise<void> {
    const limitBytes = user.quotaBytes ?? (await this.installation.get()).accountBytes;
    const usedBytes = await this.usedBytes(user);
    if (usedBytes + moreBytes <= limitBytes) return;
    throw new AppError(
      'too-large',
      `You keep ${told(usedBytes)} here and may keep ${told(limitBytes)}, so this take has no room. Delete takes (each frees its room after 30 days), or ask whoever runs this site for more.`,
    );
  }

  private async usedBytes({ id }: User): Promise<number> {
    const [row] = await this.em
      .getConnection()
      .execute<{ bytes: number }[]>(`select ${storedBytes} as bytes from "user" u where u.id = ?`, [id]);
    return row?.bytes ?? 0;
  }
}
