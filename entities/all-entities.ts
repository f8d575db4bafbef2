import { Comment } from './comment.entity';
import { Membership } from './membership.entity';
import { Project } from './project.entity';
import { ProjectMember } from './project-member.entity';
import { Revision } from './revision.entity';
import { Session } from './session.entity';
import { Shop } from './shop.entity';
import { ShopCutter } from './shop-cutter.entity';
import { SignInFailure } from './sign-in-failure.entity';
import { User } from './user.entity';

/** Listed by hand: a bundler renames and moves files, so a folder cannot be scanned. */
export const ALL_ENTITIES = [
  User,
  Session,
  SignInFailure,
  Shop,
  Membership,
  ShopCutter,
  Project,
  ProjectMember,
  Revision,
  Comment,
];
