/** NIST SP 800-63B §5.1.1.2: length counts, composition rules do not; known and guessable passwords are refused. */
export const PASSWORD_MIN = 10;
export const PASSWORD_MAX = 200;

/** What people choose most: the words themselves, whatever digits or marks stand around them. */
const COMMON = new Set(
  `password passwort motdepasse contrasena senha wachtwoord passw0rd p@ssword p@ssw0rd pa55word passphrase letmein
  letmeinnow iloveyou iloveyouforever welcome welcomehome welcomeback changeme changemenow changethis trustnoone
  administrator adminadmin admin root superuser supervisor master mastermaster secret secretsecret topsecret default
  guest testtest testing testpassword temporary temppassword temppass newpassword mypassword thepassword yourpassword
  nopassword passwordpassword qwertyqwerty qwertyuiop qwertyuiopasdf qwertzuiop azertyuiop asdfghjkl asdfghjklzxc
  asdfasdfasdf zxcvbnm zxcvbnmasdf qazwsxedc qazwsxedcrfv qweasdzxc qweqweqwe qwerty azerty abcdefgh abcdefghij
  abcabcabc abcdabcd aaaaaaaaaa princess sunshine football footballer baseball basketball superman batman starwars
  pokemon dragon monkey shadow michael jennifer jordan charlie liverpool chelsea arsenal barcelona manchester
  computer internet samsung google facebook whatever nothing freedom blahblah blahblahblah computercomputer
  godisgood jesuschrist lovelove loveyou mylove babygirl chocolate butterfly cheese summer winter spring autumn
  boardwake oscilloscope soldering solderingiron breadboard multimeter resistor capacitor raspberry raspberrypi arduino`
    .split(/\s+/)
    .filter(Boolean),
);

const RUNS = [
  "01234567890123456789",
  "98765432109876543210",
  "abcdefghijklmnopqrstuvwxyz",
  "zyxwvutsrqponmlkjihgfedcba",
  "qwertyuiopasdfghjklzxcvbnm",
];

/** One sentence that says why a password will not do, or undefined. `email` is the address of the account. */
export function passwordWeakness(password: string, email?: string): string | undefined {
  const plain = password.normalize("NFKC").toLowerCase();
  if ([...password].length < PASSWORD_MIN)
    return `Use at least ${PASSWORD_MIN} characters. Four unrelated words are easy to keep in mind.`;
  if ([...password].length > PASSWORD_MAX) return `Use at most ${PASSWORD_MAX} characters.`;
  if (email && isTheAddress(plain, email))
    return "The password is your e-mail address. Choose something that nobody can look up.";
  if (isCommon(plain) || isRepetition(plain) || isRun(plain)) {
    return "This password is among the first that anybody would try. Choose another.";
  }
  return undefined;
}

function isTheAddress(plain: string, email: string): boolean {
  const address = email.toLowerCase();
  const core = lettersOf(plain);
  return plain === address || core === lettersOf(address) || core === lettersOf(address.split("@")[0] ?? "");
}

const lettersOf = (text: string) => text.replace(/[^\p{L}]/gu, "");

function isCommon(plain: string): boolean {
  const core = plain.replace(/^[^\p{L}]+|[^\p{L}]+$/gu, "");
  return COMMON.has(core) || COMMON.has(lettersOf(plain)) || COMMON.has(plain);
}

/** "abcabcabcabc", "1111111111". */
function isRepetition(plain: string): boolean {
  return /^(.{1,5})\1+.{0,4}$/su.test(plain) && new Set(plain).size <= 5;
}

/** A piece of the alphabet, of the digits or of the keyboard's rows. */
const isRun = (plain: string) => RUNS.some((run) => run.includes(plain));
