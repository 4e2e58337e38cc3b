import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ClubModule } from '../club/club.module';
import { DuesModule } from '../dues/dues.module';
import { LedgerModule } from '../ledger/ledger.module';
import { BankStatement } from './bank-statement.entity';
import { BookItems } from './book-items';
import { Bookkeeper } from './bookkeeper';
import { Matcher } from './matcher';
import { ReconciliationController } from './reconciliation.controller';
import { ReconciliationService } from './reconciliation.service';
import { StatementImportService } from './statement-import.service';
import { StatementsRepository } from './statements.repository';

@Module({
  imports: [TypeOrmModule.forFeature([BankStatement]), ClubModule, DuesModule, LedgerModule],
  controllers: [ReconciliationController],
  providers: [
    BookItems,
    Bookkeeper,
    Matcher,
    ReconciliationService,
    StatementImportService,
    StatementsRepository,
  ],
  exports: [ReconciliationService, StatementImportService],
})
export class ReconciliationModule {}
