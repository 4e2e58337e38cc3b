import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ClubModule } from '../club/club.module';
import { DuesModule } from '../dues/dues.module';
import { LedgerModule } from '../ledger/ledger.module';
import { BankStatement } from './bank-statement.entity';
import { BookItems } from './book-items';
import { Bookkeeper } from './bookkeeper';
import { LineSettler } from './line-settler';
import { Matcher } from './matcher';
import { ReconciliationController } from './reconciliation.controller';
import { ReconciliationService } from './reconciliation.service';
import { SelfMatching } from './self-matching';
import { StatementImportService } from './statement-import.service';
import { StatementsRepository } from './statements.repository';

@Module({
  imports: [TypeOrmModule.forFeature([BankStatement]), ClubModule, DuesModule, LedgerModule],
  controllers: [ReconciliationController],
  providers: [
    BookItems,
    Bookkeeper,
    LineSettler,
    Matcher,
    ReconciliationService,
    SelfMatching,
    StatementImportService,
    StatementsRepository,
  ],
  exports: [ReconciliationService, StatementImportService],
})
export class ReconciliationModule {}
