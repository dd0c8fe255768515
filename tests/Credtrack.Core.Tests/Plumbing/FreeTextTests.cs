using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Tests.Plumbing;

/// <summary>
/// The phrases are a list of strings as they stand in notes at the bedside, invented for checks of this kind: those that hold an identifier
/// (by the kinds of 45 CFR 164.514(b)(2)) and those that only look like one.
/// </summary>
public sealed class FreeTextTests
{
    [Theory]
    [InlineData("MRN 00482915 FAST neg", "a number of a person or a record")]
    [InlineData("mrn:7741-2290", "a number of a person or a record")]
    [InlineData("MRN is 1234567", "a number of a person or a record")]
    [InlineData("pt id A20931", "a number of a person or a record")]
    [InlineData("Accession # 20931882", "a number of a person or a record")]
    [InlineData("chart # 55-1034", "a number of a person or a record")]
    [InlineData("CSN 100238741", "a number of a person or a record")]
    [InlineData("ID 4488213", "a number of a person or a record")]
    [InlineData("ID.٤٤٨٨٢١٣", "a number of a person or a record")]
    [InlineData("20260314", "a number of a person or a record")]
    [InlineData("call 555-867-5309", "a number of a person or a record")]
    [InlineData("(555) 867-5309", "a number of a person or a record")]
    [InlineData("+44 20 7946 0958", "a number of a person or a record")]
    [InlineData("078-05-1120", "a number of a person or a record")]
    [InlineData("DOB 5/6/71", "a date of birth")]
    [InlineData("born 1971", "a date of birth")]
    [InlineData("seen 03/14/2026 in ED", "a date")]
    [InlineData("scan on 14.03.2026", "a date")]
    [InlineData("2026-03-14 RUQ", "a date")]
    [InlineData("3/14/26", "a date")]
    [InlineData("10.2.33.4", "a date")]
    [InlineData("March 14, 2026", "a date")]
    [InlineData("14 Mar 2026", "a date")]
    [InlineData("jane.doe@example.org", "an e-mail address")]
    [InlineData("Mr. Jones had free fluid", "a name")]
    [InlineData("Mrs O’Neill", "a name")]
    [InlineData("Patient: Jane Doe", "a name")]
    [InlineData("pt name = Smith, John", "a name")]
    public void What_has_the_form_of_an_identifier_is_refused_in_words(string text, string kind)
    {
        var why = $"This looks like {kind}. Take it out: nothing here may identify a patient.";
        Assert.Equal(why, FreeText.WhyNotKeep(text));
        Assert.Equal(why, FreeText.WhyNotReason($"The wrong one.\nSee {text}, please."));
    }

    [Theory] // of the same list: a program that refused these would refuse too much else; the hint beside the field asks a person
    [InlineData("on Dec 3rd")]
    [InlineData("in room 412")]
    [InlineData("12 Elm Street")]
    [InlineData("92 yo F with dyspnoea")]
    [InlineData("DOE, JANE")]
    [InlineData("Jane Doe came in with chest pain")]
    [InlineData("scanned last Tuesday")]
    public void What_only_a_person_can_tell_is_left_to_the_person(string text) => Assert.Null(FreeText.WhyNotKeep(text));

    public static TheoryData<string> Plain =>
    [
        "EF 55% by eye", "BP 120/80, HR 88", "LVOT VTI 18.4 cm, TAPSE 22 mm", "B-lines in 3/8 zones", "aorta 2.1 x 2.3 cm, no AAA", "MI 0.9 TIS 0.7", "probe 5-2 MHz curvilinear",
        "Murphy’s sign negative, wall 2.4 mm", "Morison’s pouch clear", "McConnell sign present", "pain 10/10", "GCS 15/15", "TV 450-500 ml", "IVC 1.8 cm, >50% collapse", "CBD 4.5 mm",
        "FHR 152 bpm, CRL 8w3d", "G2P1 at 32 weeks", "45 yo M with dyspnoea", "2/3 of LV", "depth 16 cm, gain 62", "PLAX, PSAX, A4C, SX views", "PRF 4340 Hz", "May have trace effusion",
        "frame rate 30.000", "5000 kHz", "CX50", "E/A 0.8, E/e’ 14", "1.5 mg x 2", "clip 3 of 12", "normal; see attending note", "1-2 cm off midline", "0.0510497 cm per pixel", "Bay view poor",
        "March test not done", "S1, S2 normal", "vein 4/4 compressible at 1, 2, 3 cm", "ETT 22 at lip", "Right, Left kidneys seen", "RV:LV 0.6", "qSOFA 1/3",
    ];

    [Theory, MemberData(nameof(Plain))]
    public void The_measures_of_the_trade_are_no_identifiers(string text) => Assert.Null(FreeText.WhyNotReason(text));

    [Theory]
    [InlineData(null)]
    [InlineData("")]
    [InlineData(" \n ")]
    public void A_reason_is_words(string? text)
    {
        Assert.Equal("Give the reason.", FreeText.WhyNotReason(text));
        Assert.Null(FreeText.WhyNotKeep(text));
    }

    [Fact]
    public void Words_keep_within_bounds()
    {
        Assert.Null(FreeText.WhyNotKeep(new string('x', FreeText.Longest)));
        Assert.Equal("Keep it within 1,000 characters.", FreeText.WhyNotKeep(new string('x', FreeText.Longest + 1)));
    }
}
