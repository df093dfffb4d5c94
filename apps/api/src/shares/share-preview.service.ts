import { Injectable } from '@nestjs/common';
import { ReportsService } from '../reports/reports.service';
import { settingsOf } from '../users/user-settings';
import { OpeningSharesService } from './opening-shares.service';

export interface SharePreview {
  title: string;
  verdict: string;
}

/** What a messenger may show of a link before it is opened: the take's title and what its sheet says in one sentence. */
@Injectable()
export class SharePreviewService {
  constructor(
    private readonly opening: OpeningSharesService,
    private readonly reports: ReportsService,
  ) {}

  /** @returns null for a link that has ended or never was */
  async find(token: string): Promise<SharePreview | null> {
    const share = await this.opening.findOpen(token);
    // What asks for a passphrase says nothing before it is given.
    if (!share?.take || share.otherTake || share.passphraseHash) return null;
    const take = share.take.unwrap();
    const reportId = take.currentReportId ?? '';
    const settings = settingsOf(share.owner.unwrap());
    const figures = reportId ? await this.reports.listFigures([reportId], settings) : null;
    const summary = figures?.get(reportId)?.summary;
    return {
      title: take.title || `Take ${take.number}`,
      verdict: summary ? [summary.strong, summary.rest].filter(Boolean).join(' ') : '',
    };
  }
}
