import { Injectable } from '@nestjs/common';
import { tryOutRankingRequest } from '@thudline/contracts';
import { everything, nothing } from '../access/take-rights';
import { ComparisonsService } from '../comparisons/comparisons.service';
import { AppError } from '../errors/app-error';
import { ReportsService } from '../reports/reports.service';
import { RoomLogService } from '../rooms/room-log.service';
import { Take } from '../takes/entities/take.entity';
import { TryOutRankingService } from '../tryouts/try-out-ranking.service';
import { TryOutsService } from '../tryouts/try-outs.service';
import { settingsOf } from '../users/user-settings';
import { Share } from './entities/share.entity';
import { OpeningSharesService } from './opening-shares.service';
import { subjectName } from './subject-name';
import { bestWords } from './try-out-words';

export interface SharePreview {
  title: string;
  verdict: string;
}

/** What a messenger may show of a link before it is opened: a title, and the verdict in a sentence. */
@Injectable()
export class SharePreviewService {
  constructor(
    private readonly opening: OpeningSharesService,
    private readonly reports: ReportsService,
    private readonly comparisons: ComparisonsService,
    private readonly tryOuts: TryOutsService,
    private readonly rankings: TryOutRankingService,
    private readonly logs: RoomLogService,
  ) {}

  /** @returns null for a link that has ended or never was; what asks for a passphrase says nothing before it is given */
  async find(token: string): Promise<SharePreview | null> {
    const share = await this.opening.findOpen(token);
    if (!share || share.passphraseHash) return null;
    const { take, otherTake, tryOut, room } = share;
    const title = subjectName(share);
    if (take && otherTake) return this.ofComparison(take.id, otherTake.id, title);
    if (take) return this.ofTake(take.unwrap(), share);
    if (tryOut) return this.ofTryOut(tryOut.id, title);
    return room ? this.ofRoom(room.id, title) : null;
  }

  private async ofTake(take: Take, share: Share): Promise<SharePreview> {
    const reportId = take.currentReportId ?? '';
    const settings = settingsOf(share.owner.unwrap());
    const figures = reportId ? await this.reports.listFigures([reportId], settings) : null;
    const summary = figures?.get(reportId)?.summary;
    return {
      title: subjectName(share),
      verdict: summary ? [summary.strong, summary.rest].filter(Boolean).join(' ') : '',
    };
  }

  private async ofComparison(beforeId: string, afterId: string, title: string): Promise<SharePreview> {
    const asked = { beforeId, afterId, reader: null, rights: nothing };
    try {
      const { line } = await this.comparisons.compare(asked);
      const [first] = line;
      return { title, verdict: first ? `${first.action} ${first.reason}`.trim() : '' };
    } catch (error) {
      // One of the two isn't measured yet: the title is still true.
      if (error instanceof AppError) return { title, verdict: '' };
      throw error;
    }
  }

  private async ofTryOut(id: string, title: string): Promise<SharePreview> {
    const tryOut = await this.tryOuts.get(id, everything);
    const { rows } = await this.rankings.rank(id, tryOutRankingRequest.parse({}));
    return { title, verdict: bestWords(tryOut, rows) };
  }

  private async ofRoom(id: string, title: string): Promise<SharePreview> {
    const { items } = await this.logs.list(id, nothing, 1);
    const [newest] = items;
    return { title, verdict: newest ? `${newest.what}: ${newest.did.strong} ${newest.did.rest}`.trim() : '' };
  }
}
