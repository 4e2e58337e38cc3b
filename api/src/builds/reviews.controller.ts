import { Controller, Get, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ListReviewsQueryDto, ReviewsPageDto } from './dto/review.dto';
import { ReviewsService } from './reviews.service';

@ApiTags('Reviews')
@Controller('reviews')
export class ReviewsController {
  constructor(private readonly reviews: ReviewsService) {}

  /** What waits for a mentor, the longest waiting first. */
  @Get()
  @Access({ roles: ['mentor'] })
  list(@CurrentActor() actor: Actor, @Query() query: ListReviewsQueryDto): Promise<ReviewsPageDto> {
    return this.reviews.list(actor, query);
  }
}
