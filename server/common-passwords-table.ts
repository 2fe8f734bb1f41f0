/** Obvious passwords of eight signs or more, in small letters: keyboard rows, counting, and words of this trade. */
export const COMMON_PASSWORDS: ReadonlySet<string> = new Set(
  `
12345678 123456789 1234567890 12345678910 87654321 987654321 0987654321 11223344 1122334455 12341234 123123123
1q2w3e4r 1q2w3e4r5t 1qaz2wsx 1qaz2wsx3edc q1w2e3r4 q1w2e3r4t5 zaq12wsx qwertyui qwertyuiop qwerty12 qwerty123
qwerty1234 qwertz123 azerty123 azertyuiop asdfghjk asdfghjkl asdf1234 zxcvbnm1 zxcvbnm123 abcdefgh abcdefghi abcd1234
abcde12345 a1b2c3d4 a123456789 aa123456 abc12345 abc123456 1234abcd 1234qwer qwer1234 asdasdasd qweqweqwe
password password1 password12 password123 password1234 password! password1! password123! passw0rd p@ssword p@ssw0rd
p@ssw0rd1 pa55word passwort passwort1 motdepasse contraseña wachtwoord passphrase mypassword newpassword changeme
changeme1 changeme123 changeit letmein1 letmein12 letmein123 letmeinnow welcome1 welcome12 welcome123 welcome1!
default1 default123 secret12 secret123 topsecret trustno1 iloveyou iloveyou1 iloveyou2 sunshine sunshine1 princess
princess1 football football1 baseball baseball1 superman superman1 batman123 dragon123 monkey123 master123 shadow123
michael1 jennifer computer computer1 internet internet1 whatever whatever1 starwars freedom1 killer123 pokemon1
liverpool liverpool1 chelsea1 arsenal1 charlie1 jordan23 hello123 hello1234 hellohello goodmorning blink182
admin123 admin1234 admin12345 adminadmin administrator administrator1 root1234 rootroot user1234 useruser guest123
guestguest test1234 test12345 testtest tester123 testing1 testing123 demo1234 demodemo temp1234 temppass
spring2024 spring2025 spring2026 summer2024 summer2025 summer2026 autumn2024 autumn2025 autumn2026 winter2024
winter2025 winter2026 january1 february february1 september september1 november december monday123 friday123
company1 company123 office123 project1 project123 building building1 concrete concrete1 concrete123 engineer
engineer1 engineer123 detailer detailer1 drafter1 inspector inspector1 stressing stressing1 tendon123 anchor123
posttension post-tension formwork formwork1 structure structure1 rebar123 reinforcement wedgeline wedgeline1
wedgeline12 wedgeline123
`
    .trim()
    .split(/\s+/),
)
