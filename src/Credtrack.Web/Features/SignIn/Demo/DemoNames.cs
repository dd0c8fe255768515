namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>Names invented for the demonstration; whoever bears one by chance is not meant.</summary>
public static class DemoNames
{
    public const string Administrator = "Ottilie Brandreth-Moss";

    public static string[] EmergencyTrainees { get; } =
    [
        "Wrenna Ostholm", "Tobias Achterkamp", "Ngozi Adelambo", "Rocco Castellane", "Maren Eskildsen", "Jude Fennimore", "Ilse Vantongeren", "Cormac Dunleavy-Pell",
        "Maximiliana-Theodora Hohenfels-Ravensburg-Okonjo", "Yusra Belkacem", "Anselm Brightwater", "Piotr Zarembski", "Lindiwe Mokwena", "Soren Askildt", "Beatrix Halloway", "Oisin Tarrant",
    ];

    public static string[] MedicineTrainees { get; } =
        ["Hana Morikawa-Lind", "Dacre Pemberwick", "Xiomara Quintavalle", "Ebbe Thorsager", "Farida Noorzai", "Grigor Manukyants", "Tamsin Oakeshadow", "Leopold Wexcombe"];

    public static string[] EmergencyReaders { get; } = ["Dr Halvard Quill", "Dr Perpetua Menlow", "Dr Isidro Balcázar-Whitcombe", "Dr Ottilie Farnsbarrow", "Dr Kwabena Estridge"];

    public static string[] MedicineReaders { get; } = ["Dr Rosalind Tremayne-Okafor", "Dr Matthias Vollenweyer", "Dr Ines Calderwood"];

    public static string AddressOf(string name) =>
        string.Join('.', name.ToLowerInvariant().Replace("á", "a", StringComparison.Ordinal).Split(' ').Where(part => part != "dr")) + "@demo.example";
}
