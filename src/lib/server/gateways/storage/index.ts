export { openDiskStorage } from './disk-storage';
export { photographTypes, type MediaType } from './media-type';
export {
	storageKey,
	type Incoming,
	type Kept,
	type Opened,
	type Received,
	type Storage
} from './storage';
