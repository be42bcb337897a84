export { hmacHex, sameDigest, sha256Hex } from './digests';
export { openSigning, type Signature, type Signing } from './signing';
