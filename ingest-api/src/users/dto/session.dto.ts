import { UserDto } from './user.dto.js';

/** Who is signed in. */
export class SessionDto {
  user!: UserDto;
}
