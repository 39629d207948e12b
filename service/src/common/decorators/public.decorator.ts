import { SetMetadata } from '@nestjs/common';

/** Metadata key of routes that need no sign-in. */
export const IS_PUBLIC = 'isPublic';

/** Marks a route that needs no sign-in. */
export const Public = () => SetMetadata(IS_PUBLIC, true);
