import { Controller, Get, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { TrialBalanceDto, TrialBalanceQueryDto } from './dto/trial-balance.dto';
import { LedgerService } from './ledger.service';

@ApiTags('Books')
@Controller('ledger')
export class LedgerController {
  constructor(private readonly ledger: LedgerService) {}

  /** Every account with its balance on its side. */
  @Get('trial-balance')
  @Access({ roles: ['treasurer'] })
  trialBalance(
    @CurrentActor() actor: Actor,
    @Query() { on }: TrialBalanceQueryDto,
  ): Promise<TrialBalanceDto> {
    return this.ledger.trialBalance(actor, on);
  }
}
