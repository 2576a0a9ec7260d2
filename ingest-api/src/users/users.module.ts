import { Module } from '@nestjs/common';
import { FirstAdministrator } from './first-administrator.js';
import { PasswordsService } from './passwords.service.js';
import { SessionController } from './session.controller.js';
import { SignInThrottle } from './sign-in-throttle.js';
import { SignInService } from './sign-in.service.js';
import { UsersController } from './users.controller.js';
import { UsersService } from './users.service.js';

@Module({
  controllers: [SessionController, UsersController],
  providers: [PasswordsService, SignInThrottle, SignInService, UsersService, FirstAdministrator],
  exports: [PasswordsService, UsersService, FirstAdministrator],
})
export class UsersModule {}
