export {
	copies,
	type CleanCopy,
	type CopyName,
	type ImageAnswer,
	type ImageQuestion
} from './copies';
export { makeImages, type Images } from './images';
export { likenessDistance } from './likeness';
