import { Body, Controller, Get, Param, ParseIntPipe, Patch, Post } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentPerson } from '../auth/principal.decorators.js';
import type { Person } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { CreateUserDto } from './dto/create-user.dto.js';
import { UpdateUserDto } from './dto/update-user.dto.js';
import { toUserDto, UserDto } from './dto/user.dto.js';
import { UsersService } from './users.service.js';

@ApiTags('accounts')
@Controller('users')
export class UsersController {
  constructor(private readonly users: UsersService) {}

  @Get()
  @ApiOperation({ summary: 'List the accounts, by name' })
  @ApiProblems()
  async list(): Promise<UserDto[]> {
    return (await this.users.list()).map(toUserDto);
  }

  @Post()
  @ApiOperation({ summary: 'Create an account' })
  @ApiProblems(400, 409, 422)
  async create(@Body() wanted: CreateUserDto, @CurrentPerson() person: Person): Promise<UserDto> {
    return toUserDto(await this.users.create(wanted, person.email));
  }

  @Patch(':userId')
  @ApiOperation({
    summary: "Change an account's name, role or password, disable or enable it",
    description:
      'Acts on the next request of whoever is signed in with it. The last administrator stays one.',
  })
  @ApiProblems(400, 404, 409, 422)
  async update(
    @Param('userId', ParseIntPipe) userId: number,
    @Body() wanted: UpdateUserDto,
    @CurrentPerson() person: Person,
  ): Promise<UserDto> {
    return toUserDto(await this.users.update(userId, wanted, person));
  }
}
