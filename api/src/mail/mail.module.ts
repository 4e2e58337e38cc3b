import { Module } from '@nestjs/common';
import { ClubModule } from '../club/club.module';
import { MailCarrier } from './mail-carrier';
import { MailService } from './mail.service';

@Module({ imports: [ClubModule], providers: [MailService, MailCarrier], exports: [MailService, MailCarrier] })
export class MailModule {}
