export { CautionList } from "./CautionList.tsx";
