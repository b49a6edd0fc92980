/** Passwords of ten characters and more that guessers try first; compared without case and without what is not a letter or digit. */
const COMMON = new Set(
  `1234567890 0123456789 0987654321 1234567891 12345678910 123456789a 123123123123 1029384756 1q2w3e4r5t 1q2w3e4r5t6y 1qaz2wsx3edc qwertyuiop
  qwertyuiop123 qwerty12345 qwerty123456 asdfghjkl123 zxcvbnm123 password12 password123 password1234 password12345 passw0rd123 p4ssw0rd123 passwordpassword
  letmein123 letmeinplease iloveyou12 iloveyou123 iloveyou1234 welcome123 welcome1234 administrator adminadmin admin12345 changeme123 changemenow
  football123 baseball123 superman123 sunshine123 princess123 dragon12345 monkey12345 abcdefghij abcdefghijk abcd123456 abc1234567 a123456789 aa12345678
  trustno1trustno1 secret12345 mypassword mypassword1 thisismypassword correcthorse correcthorsebatterystaple sailing123 sailboat123 yachting123 skipper123 captain123 boatboatboat
  marinediesel dieselengine summer2024 summer2025 summer2026 winter2025 winter2026 spring2026 autumn2026`.split(/\s+/),
);

/** Would a guesser try it early? Said of passwords that are long enough already. */
export function isEasilyGuessed(password: string): boolean {
  const plain = password.toLowerCase().replace(/[^a-z0-9]/g, "");
  return COMMON.has(plain) || new Set(password).size < 4;
}
