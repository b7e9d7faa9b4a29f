import { settingsKey } from "./device-settings";

/**
 * Runs in the page's head before paint, so that a dark or metric page never flashes. Constant, so that its hash can stand in
 * the content security policy of static and dynamic pages alike. Keep it in step with `applySettings`.
 */
export const settingsScript = `try{var s=JSON.parse(localStorage.getItem("${settingsKey}")||"{}"),d=document.documentElement;/^(light|dark|sun)$/.test(s.theme)&&d.setAttribute("data-theme",s.theme);s.units==="mm"&&d.setAttribute("data-units","mm")}catch(e){}`;
