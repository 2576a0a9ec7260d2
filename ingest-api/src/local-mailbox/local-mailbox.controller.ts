import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { FindMailsDto, MailboxMailDto, MailboxPageDto } from './dto/mailbox.dto.js';
import { LocalMailboxService } from './local-mailbox.service.js';

@ApiTags('mailbox')
@Controller('mailbox')
export class LocalMailboxController {
  constructor(private readonly mailbox: LocalMailboxService) {}

  @Get()
  @ApiOperation({ summary: 'List the mails of the local mailbox; exists only with the local mail transport' })
  @ApiProblems(404, 422)
  list(@Query() { to }: FindMailsDto): MailboxPageDto {
    return this.mailbox.list(to);
  }

  @Get(':mailId')
  @ApiOperation({ summary: 'Read a mail of the local mailbox' })
  @ApiProblems(404)
  find(@Param('mailId') mailId: string): Promise<MailboxMailDto> {
    return this.mailbox.find(mailId);
  }
}
