import { Body, Controller, Get, HttpCode, Post, Req, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { Access, type SignedInRequest } from '../common/access';
import { Environment } from '../config/environment';
import type { SignedInUser } from './access-token.strategy';
import { AuthService, type SignedIn } from './auth.service';
import { ACCESS_COOKIE, clearCookies, cookieOf, REFRESH_COOKIE, setCookies } from './cookies';
import { MeDto, meDto } from './dto/me.dto';
import { SignInDto } from './dto/sign-in.dto';
import { SessionsService } from './sessions.service';
import { readRefreshToken } from './tokens';

@ApiTags('Signing in')
@Controller('auth')
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly sessions: SessionsService,
    private readonly environment: Environment,
  ) {}

  /** Starts a session. The tokens come as httpOnly cookies; scripts never see them. */
  @Post('sign-in')
  @HttpCode(200)
  @Access('public')
  async signIn(
    @Body() body: SignInDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<MeDto> {
    const signedIn = await this.auth.signIn(body, request.ip ?? 'unknown');
    this.answer(response, signedIn);
    return meDto(await this.sessions.liveOrRefuse(signedIn.sessionId));
  }

  /** Exchanges the refresh cookie for the next pair. */
  @Post('refresh')
  @HttpCode(204)
  @Access('public')
  async refresh(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    this.answer(response, await this.auth.refresh(readRefreshToken(cookieOf(request, REFRESH_COOKIE))));
  }

  /** Ends the session on the server. Safe to repeat. */
  @Post('sign-out')
  @HttpCode(204)
  @Access('public')
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    const refreshToken = readRefreshToken(cookieOf(request, REFRESH_COOKIE));
    await this.auth.signOut(refreshToken, cookieOf(request, ACCESS_COOKIE));
    clearCookies(response, this.environment);
  }

  /** Who is signed in. */
  @Get('me')
  @Access('signed-in')
  me(@Req() request: SignedInRequest & { user: SignedInUser }): MeDto {
    return meDto(request.user);
  }

  private answer(response: Response, signedIn: SignedIn): void {
    setCookies(response, this.environment, signedIn);
  }
}
