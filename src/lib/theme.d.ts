export declare const themeChoices: readonly ["system", "sheet", "dim"];
export type ThemeChoice = (typeof themeChoices)[number];
export declare const themeNames: Record<ThemeChoice, string>;
/** Sets and remembers the theme; `system` forgets the choice. */
export declare function chooseTheme(choice: ThemeChoice): void;
export declare const useThemeChoice: () => ThemeChoice;
/** Which of the two themes is on the screen now. */
export declare function useShownTheme(): 'sheet' | 'dim';
