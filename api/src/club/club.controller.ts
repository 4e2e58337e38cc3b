import { Controller, Get } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access } from '../common/access';
import { ClubService } from './club.service';
import { ClubDto } from './dto/club.dto';

@ApiTags('Club')
@Controller('club')
export class ClubController {
  constructor(private readonly club: ClubService) {}

  /** The club's name, zone and currency. */
  @Get()
  @Access('public')
  front(): Promise<ClubDto> {
    return this.club.front();
  }
}
