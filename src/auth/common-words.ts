/** Words that passwords are guessed from: everybody's, and those of this trade. Our own short list. */
export const commonWords: readonly string[] = [
  "password passwort passwd passphrase letmein welcome willkommen admin administrator root login sign access secret",
  "geheim default change changeme master user guest test demo sample hello hallo please qwerty qwertz azerty asdf",
  "abc123 iloveyou love monkey dragon sunshine football baseball princess superman batman starwars pokemon shadow",
  "killer trustno1 whatever freedom summer winter spring autumn january february march april june july august",
  "september october november december monday friday computer internet keyboard mustang ferrari",
  "evenrail injector injectors injection fuel diesel petrol gasoline heptane nozzle rail spray flow pulse bench",
  "cylinder calibration certificate workshop garage laboratory lab motor motors engine engines racing cleaning",
  "service technician manager counter customer",
].flatMap((line) => line.split(" "));
