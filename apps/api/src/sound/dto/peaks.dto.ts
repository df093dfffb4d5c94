import { peaksRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class PeaksDto extends createZodDto(peaksRequest) {}
