using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Text;
using Convection.Correlations.Catalogue;

// Writes the catalogue of all correlations. Run from the root of the repository: dotnet run --project docs/catalogue-writer
string root = args.Length > 0 ? args[0] : Directory.GetCurrentDirectory();
string folder = Path.Combine(root, "docs", "catalogue");
if (!Directory.Exists(Path.Combine(root, "docs")))
{
    Console.Error.WriteLine("'" + root + "' is not the root of the repository: it has no folder 'docs'.");
    return 1;
}

SortedDictionary<string, string> files = CatalogueFiles.Write(root);
Directory.CreateDirectory(folder);
foreach (string stale in Directory.GetFiles(folder).Where(f => !files.ContainsKey(Path.GetFileName(f))))
{
    File.Delete(stale);
}

foreach ((string name, string content) in files)
{
    File.WriteAllText(Path.Combine(folder, name), content, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
}

Console.WriteLine(files.Count + " files in " + folder);
return 0;
