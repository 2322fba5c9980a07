export { ElsewhereLinks } from "./ElsewhereLinks.tsx";
export { NotFoundScreen } from "./NotFoundScreen.tsx";
export { PersonMenu } from "./PersonMenu.tsx";
export { PublicFrame } from "./PublicFrame.tsx";
export { ShopFrame } from "./ShopFrame.tsx";
