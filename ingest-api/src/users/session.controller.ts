import { Body, Controller, Delete, Get, HttpCode, Ip, Post, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Response } from 'express';
import { CurrentPerson } from '../auth/principal.decorators.js';
import type { Person } from '../auth/principals.js';
import { SessionCookie } from '../auth/session-cookie.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { ChangePasswordDto } from './dto/change-password.dto.js';
import { SessionDto } from './dto/session.dto.js';
import { SignInDto } from './dto/sign-in.dto.js';
import { toUserDto } from './dto/user.dto.js';
import { SignInService } from './sign-in.service.js';

@ApiTags('accounts')
@Controller('session')
export class SessionController {
  constructor(
    private readonly signIns: SignInService,
    private readonly cookie: SessionCookie,
  ) {}

  @Post()
  @HttpCode(200)
  @ApiOperation({
    summary: 'Sign in',
    description: 'Sets the cookie `ampkeep_session` for 12 hours. Repeated failures bring growing pauses.',
  })
  @ApiProblems(400, 422)
  async signIn(
    @Body() credentials: SignInDto,
    @Ip() address: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionDto> {
    const { user, session } = await this.signIns.signIn(credentials, address);
    await this.cookie.write(response, session);
    return { user: toUserDto(user) };
  }

  @Get()
  @ApiOperation({ summary: 'Who is signed in' })
  @ApiProblems()
  async current(@CurrentPerson() person: Person): Promise<SessionDto> {
    return { user: toUserDto(await this.signIns.account(person)) };
  }

  @Delete()
  @HttpCode(204)
  @ApiOperation({ summary: 'Sign out' })
  @ApiNoContentResponse({ description: 'Signed out' })
  @ApiProblems()
  async signOut(
    @CurrentPerson() person: Person,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    await this.signIns.signOut(person);
    this.cookie.clear(response);
  }

  @Post('password')
  @HttpCode(204)
  @ApiOperation({ summary: 'Change the own password; ends the other sessions of the account' })
  @ApiNoContentResponse({ description: 'Changed' })
  @ApiProblems(400, 422)
  changePassword(
    @Body() passwords: ChangePasswordDto,
    @CurrentPerson() person: Person,
    @Ip() address: string,
  ): Promise<void> {
    return this.signIns.changePassword(person, passwords, address);
  }
}
