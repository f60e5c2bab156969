/** Passwords that turn up most often in published lists (from memory, not verified); compared in lower case, at least 8 characters. */
export const COMMON_PASSWORDS: ReadonlySet<string> = new Set(
  `12345678 123456789 1234567890 12345678910 123123123 1234512345 11111111 111111111 1111111111 00000000 0000000000
  22222222 33333333 55555555 66666666 77777777 88888888 99999999 87654321 987654321 0987654321 9876543210 11223344
  1122334455 12341234 12121212 123321123 123456123 123654789 147258369 1472583690 147852369 159357159 741852963 789456123 963852741
  password password1 password12 password123 password1234 password! passw0rd p@ssw0rd p@ssword p@55w0rd pa55word pass1234
  passpass passport qwertyui qwerty12 qwerty123 qwerty1234 qwerty12345 qwertyuiop qwertyuiop123 1qaz2wsx 1q2w3e4r 1q2w3e4r5t
  q1w2e3r4 q1w2e3r4t5 zaq12wsx zaq1zaq1 1qazxsw2 qazwsxedc qazwsx123 asdfghjk asdfghjkl asdf1234 asdfasdf zxcvbnm1 zxcvbnm123
  abcd1234 abc12345 abcdefgh abcdefg1 a1234567 a12345678 a123456789 aa123456 aaaaaaaa abc123456 iloveyou iloveyou1 iloveyou2
  sunshine sunshine1 princess princess1 football football1 baseball baseball1 basketball superman superman1 batman123
  starwars startrek trustno1 whatever whatever1 welcome1 welcome12 welcome123 welcome1234 letmein1 letmein123 letmein!
  admin123 admin1234 administrator adminadmin root1234 rootroot changeme changeme1 changeme123 default1 secret123 secretsecret
  test1234 testtest testing1 testing123 temp1234 guest123 guestguest user1234 login123 master123 computer computer1
  internet internet1 samsung1 michelle jennifer jessica1 jonathan danielle victoria elizabeth alexander anthony1 charlie1
  michael1 nicholas matthew1 christopher benjamin patricia veronica liverpool liverpool1 chelsea1 arsenal1 barcelona manchester
  dragon123 monkey123 shadow123 killer123 pokemon1 pokemon123 naruto123 hello123 hello1234 hellohello hunter12 ginger12 butterfly
  chocolate cheese123 lovelove loveme123 loveyou1 mylove123 godisgood jesus123 blessed1 charlotte midnight mercedes corvette
  maverick mustang1 scorpion slipknot metallica nirvana1 december november september october1 february january1 summer2024
  summer2025 summer2026 winter2024 winter2025 winter2026 spring2025 spring2026 autumn2025 autumn2026 monday123 friday123
  access14 aq123456 azertyui azerty123 azertyuiop soleil123 motdepasse contrasena contraseña hola1234 mariposa estrella
  passwort passwort1 hallo123 schatzi1 ficken123 qwertz123 qwertzui wachtwoord welkom01 welkom123 parola123 senha123 senha1234
  111222333 112233445566 123qweasd 123qweasdzxc qweasdzxc qweasd123 qwe123456 1password 1234qwer qwer1234 qwerqwer wasd1234
  google123 facebook facebook1 linkedin1 yahoo123 hotmail1 gmail123 microsoft windows1 office365 engineer engineer1 insulator
  insulators substation transmission highvoltage powerline electric electric1 electricity voltage1 voltage123`
    .split(/\s+/)
    .filter(Boolean),
);
